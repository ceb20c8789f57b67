import { type RefObject, useCallback, useEffect, useRef, useState } from "react";

/**
 *   off        nobody asked for it yet
 *   asking     the browser asks the person, or the reader is being loaded
 *   reading    the picture runs and is looked at
 *   refused    the person or the browser said no
 *   none       there is no camera, or another program holds it
 *   insecure   browsers lend a camera to https pages only
 *   fault      the reader could not be fetched or fell over
 */
export type CameraState = "off" | "asking" | "reading" | "refused" | "none" | "insecure" | "fault";

const BETWEEN_LOOKS_MS = 120;

const NO_CAMERA = ["NotFoundError", "NotReadableError", "OverconstrainedError", "AbortError"];

function stateOf(error: unknown): CameraState {
  if (!(error instanceof DOMException)) return "fault";
  if (error.name === "NotAllowedError" || error.name === "SecurityError") return "refused";
  return NO_CAMERA.includes(error.name) ? "none" : "fault";
}

async function isGranted(): Promise<boolean> {
  try {
    return (await navigator.permissions.query({ name: "camera" })).state === "granted";
  } catch {
    // Not every browser tells; then the person presses the button.
    return false;
  }
}

function openCamera(): Promise<MediaStream> {
  return navigator.mediaDevices.getUserMedia({
    audio: false,
    video: { facingMode: "environment", width: { ideal: 1280 }, height: { ideal: 720 } },
  });
}

/**
 * Runs the camera into a video element and reads QR pictures until it is let go of. Starts by itself when the person
 * allowed it before; lets the camera go when the page is left.
 * @param onText called for every picture that was read, again and again while it is in sight
 */
export function useCamera(onText: (text: string) => void): {
  state: CameraState;
  video: RefObject<HTMLVideoElement | null>;
  start: () => void;
  stop: () => void;
} {
  const [state, setState] = useState<CameraState>("off");
  const video = useRef<HTMLVideoElement>(null);
  const latest = useRef(onText);
  latest.current = onText;
  /** The run in hand; a run that is no longer this one stops by itself. */
  const run = useRef(0);
  const stream = useRef<MediaStream | null>(null);

  const letGo = useCallback(() => {
    run.current++;
    for (const track of stream.current?.getTracks() ?? []) track.stop();
    stream.current = null;
  }, []);

  const start = useCallback(async () => {
    letGo();
    const mine = run.current;
    const isMine = () => run.current === mine;
    if (!navigator.mediaDevices) {
      setState(window.isSecureContext ? "none" : "insecure");
      return;
    }
    setState("asking");
    try {
      const opened = await openCamera();
      if (!isMine()) {
        for (const track of opened.getTracks()) track.stop();
        return;
      }
      stream.current = opened;
      const { makeReader } = await import("./read-picture");
      const element = video.current;
      if (!isMine() || !element) return;
      element.srcObject = opened;
      await element.play();
      const read = makeReader();
      setState("reading");
      while (isMine()) {
        const text = element.readyState >= element.HAVE_CURRENT_DATA ? await read(element) : null;
        if (text !== null && isMine()) latest.current(text);
        await new Promise((resolve) => setTimeout(resolve, BETWEEN_LOOKS_MS));
      }
    } catch (error) {
      if (!isMine()) return;
      letGo();
      setState(stateOf(error));
    }
  }, [letGo]);

  useEffect(() => {
    let gone = false;
    void isGranted().then((granted) => {
      if (granted && !gone) void start();
    });
    window.addEventListener("pagehide", letGo);
    return () => {
      gone = true;
      window.removeEventListener("pagehide", letGo);
      letGo();
    };
  }, [start, letGo]);

  const stop = useCallback(() => {
    letGo();
    setState("off");
  }, [letGo]);
  return { state, video, start: () => void start(), stop };
}
