import type { RefObject } from "react";
import { Button } from "../../ui/button";
import type { CameraState } from "./use-camera";

const WORDS: Record<CameraState, { head: string; help: string }> = {
  off: { head: "The camera is off.", help: "It is used only to read tags; no picture is kept or sent." },
  asking: { head: "Getting the camera…", help: "If the browser asks, allow it." },
  reading: {
    head: "Hold the tag in the frame.",
    help: "It goes on by itself. A hand's width away is about right.",
  },
  refused: {
    head: "The browser keeps the camera from us.",
    help: "Allow it beside the address at the top, then try again. Or type the code.",
  },
  none: {
    head: "No camera can be used here.",
    help: "There is none, or another program holds it. Type the code or use a scanner.",
  },
  insecure: {
    head: "Browsers lend a camera to https pages only.",
    help: "This page came over plain http. Type the code, use a scanner, or ask whoever looks after the server for https.",
  },
  fault: {
    head: "The reader could not be fetched.",
    help: "Look at the network, then try again. Or type the code.",
  },
};

/** The camera's picture with the frame to hold a tag in, and what the camera is doing, in words. */
export function Viewfinder({
  state,
  video,
  stranger,
  onStart,
  onStop,
}: {
  state: CameraState;
  video: RefObject<HTMLVideoElement | null>;
  /** A picture was read that is not ours; the camera reads on. */
  stranger: string | null;
  onStart: () => void;
  onStop: () => void;
}) {
  const runs = state === "reading";
  const { head, help } = stranger && runs ? { head: stranger, help: "Still reading." } : WORDS[state];
  return (
    <section aria-label="Camera" className="grid content-start gap-3">
      <div className="relative aspect-[4/3] w-full overflow-hidden rounded-[3px] bg-[#1a1b1d]">
        <video
          ref={video}
          muted
          playsInline
          aria-label="What the camera sees"
          className={`h-full w-full object-cover ${runs ? "" : "invisible"}`}
        />
        <Frame lit={runs} />
        {runs ? null : (
          <div className="absolute inset-0 grid place-items-center p-6">
            {state === "asking" ? (
              <p className="rounded-[3px] bg-[#1a1b1d]/80 px-3 py-1 text-lg text-white">
                {WORDS.asking.head}
              </p>
            ) : (
              <Button tone="go" size="l" type="button" onClick={onStart}>
                {state === "off" ? "Use the camera" : "Try the camera again"}
              </Button>
            )}
          </div>
        )}
      </div>
      <div className="flex min-h-12 items-start justify-between gap-4">
        <p role="status">
          <b className={`block font-semibold ${stranger && runs ? "text-oxide" : ""}`}>{head}</b>
          <span className="text-concrete-700">{help}</span>
        </p>
        {runs ? (
          <Button tone="plain" size="m" type="button" onClick={onStop} className="shrink-0">
            Stop the camera
          </Button>
        ) : null}
      </div>
    </section>
  );
}

/** The corners to hold a tag in, and a plumb line down their middle. */
function Frame({ lit }: { lit: boolean }) {
  const corner = (x: number, y: number, dx: number, dy: number) => `M${x} ${y + 26 * dy}V${y}H${x + 26 * dx}`;
  return (
    <svg
      viewBox="0 0 400 300"
      className="pointer-events-none absolute inset-0 h-full w-full"
      aria-hidden="true"
    >
      <path
        d={[
          corner(90, 40, 1, 1),
          corner(310, 40, -1, 1),
          corner(90, 260, 1, -1),
          corner(310, 260, -1, -1),
        ].join("")}
        fill="none"
        stroke={lit ? "#e3b25b" : "#565a5f"}
        strokeWidth="4"
        strokeLinecap="square"
      />
    </svg>
  );
}
