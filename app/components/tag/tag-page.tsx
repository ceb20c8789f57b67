import { useState } from "react";
import { Link, useFetcher } from "react-router";
import { VEHICLE_KIND, type VehicleKind } from "../../domain/builds/vehicle-kinds";
import { Button, buttonClass } from "../../ui/button";
import { Dialog } from "../../ui/dialog";
import { PaperTag } from "./paper-tag";

export type TagPageProps = {
  buildId: number;
  tag: { code: string; nickname: string; kind: VehicleKind };
  address: string;
  qr: { size: number; path: string };
  size: "label" | "sheet";
};

/** Four copies of one tag, each with its own place. */
const PLACES = ["on the vehicle", "on the keys", "parts bin", "job folder"] as const;

/** The page's own size in print: the label printer's, or the paper that the office printer has. */
const PAGE_RULE = {
  label: "@page { size: 62mm 100mm; margin: 0; }",
  sheet: "@page { size: auto; margin: 10mm; }",
} as const;

/** The vehicle's tag, as it will be printed, with what can be done about it. */
export function TagPage({ buildId, tag, address, qr, size }: TagPageProps) {
  const paper = { nickname: tag.nickname, code: tag.code, kind: VEHICLE_KIND[tag.kind].label, qr };
  return (
    <main className="tag-main grid content-start gap-5 p-4 sm:p-6 lg:grid-cols-[minmax(0,1fr)_22rem] lg:gap-10">
      <style>{PAGE_RULE[size]}</style>
      <h1 className="sr-only">
        Tag of {tag.nickname}, {tag.code}
      </h1>
      <div className={`tag-stage grid justify-items-center ${size === "sheet" ? "is-sheet" : ""}`}>
        {size === "label" ? (
          <PaperTag {...paper} shape="label" goesOn={PLACES[0]} />
        ) : (
          <div className="tag-sheet">
            {PLACES.map((place, index) => (
              <PaperTag key={place} {...paper} shape="quarter" goesOn={place} again={index > 0} />
            ))}
          </div>
        )}
      </div>
      <Controls buildId={buildId} tag={tag} address={address} size={size} />
    </main>
  );
}

function Controls({ buildId, tag, address, size }: Omit<TagPageProps, "qr">) {
  return (
    <aside aria-label="Print" className="no-print order-first grid content-start gap-5 lg:order-none">
      <nav aria-label="Size" className="flex gap-1">
        <SizeLink to="?size=label" here={size === "label"} name="One label" help="62 × 100 mm" />
        <SizeLink to="?size=sheet" here={size === "sheet"} name="Sheet of four" help="letter or A4" />
      </nav>
      <div className="flex flex-wrap gap-3">
        <Button tone="go" size="l" type="button" onClick={() => window.print()}>
          Print
        </Button>
        <Link to={`/builds/${buildId}`} className={buttonClass("plain", "l")}>
          To the build
        </Link>
      </div>
      <div className="hidden gap-5 lg:grid">
        <p className="text-concrete-700">
          Print at 100 %, without “fit to page”. Hang it where a hand reaches it: the mirror or the steering
          wheel, never a part that comes off.
        </p>
        <p className="text-concrete-700">
          The picture opens <span className="break-all font-medium text-ink">{address}</span>
        </p>
        <Replace code={tag.code} nickname={tag.nickname} />
      </div>
    </aside>
  );
}

function SizeLink({ to, here, name, help }: { to: string; here: boolean; name: string; help: string }) {
  return (
    <Link
      to={to}
      replace
      aria-current={here ? "true" : undefined}
      className={`grid min-h-12 grow content-center border-b-[3px] px-3 py-1 ${here ? "border-brass bg-brass-wash" : "border-concrete-300 bg-chalk"}`}
    >
      <span className="font-semibold">{name}</span>
      <span className="text-[15px] text-concrete-700">{help}</span>
    </Link>
  );
}

type Replaced = { ok: true; words: string } | { ok: false; message: string };

/** A lost tag is replaced by one with another code; asks first, since the old one is dead from then on. */
function Replace({ code, nickname }: { code: string; nickname: string }) {
  const [asked, setAsked] = useState(false);
  const fetcher = useFetcher<Replaced>();
  const words = fetcher.data ? (fetcher.data.ok ? fetcher.data.words : fetcher.data.message) : null;
  return (
    <div className="grid justify-items-start gap-2 border-concrete-200 border-t pt-4">
      <Button busy={fetcher.state !== "idle"} onClick={() => setAsked(true)}>
        The tag is lost…
      </Button>
      <p role="status" className={`font-medium ${fetcher.data?.ok ? "text-moss" : "text-oxide"}`}>
        {words}
      </p>
      <Dialog
        open={asked}
        onClose={() => setAsked(false)}
        title={`Make a new tag for ${nickname}?`}
        sign="scan-tag"
        tone="ask"
        actions={
          <>
            <Button data-autofocus onClick={() => setAsked(false)}>
              Keep {code}
            </Button>
            <Button
              tone="stop"
              onClick={() => {
                setAsked(false);
                void fetcher.submit({ code }, { method: "post" });
              }}
            >
              Make a new one
            </Button>
          </>
        }
      >
        <p>
          {code} will lead nowhere any more, and no vehicle gets it again. Print the new tag and take every
          old one off.
        </p>
      </Dialog>
    </div>
  );
}
