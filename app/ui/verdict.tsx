import type { ReactNode } from "react";
import { Sign, type SignName } from "./sign";

export type VerdictTone =
  | "true"
  | "not-true"
  | "void"
  | "in-hand"
  | "waiting"
  | "approved"
  | "hold"
  | "empty"
  | "kept"
  | "unsent";

const GROUND: Record<VerdictTone, string> = {
  true: "bg-moss-wash text-moss",
  approved: "bg-moss-wash text-moss",
  "not-true": "bg-oxide-wash text-oxide",
  void: "bg-oxide-wash text-oxide",
  hold: "bg-oxide-wash text-oxide",
  "in-hand": "bg-brass-wash text-brass-ink",
  waiting: "bg-brass-wash text-brass-ink",
  unsent: "bg-brass-wash text-brass-ink",
  empty: "bg-chalk text-concrete-500",
  kept: "bg-chalk text-concrete-500",
};

/** The edge is drawn so that the state reads without colour: straight, tilted, broken, dotted, dashed, thick, a chock. */
function Edge({ tone }: { tone: VerdictTone }) {
  const line = { stroke: "currentColor", fill: "none", vectorEffect: "non-scaling-stroke" } as const;
  return (
    <svg
      className="absolute inset-x-0 bottom-0 h-3 w-full"
      viewBox="0 0 100 12"
      preserveAspectRatio="none"
      aria-hidden="true"
    >
      {tone === "not-true" ? <path d="M0 11L100 2" strokeWidth="3" {...line} /> : null}
      {tone === "void" ? <path d="M0 10.500H46L49 5M53 8L56 2.500H100" strokeWidth="3" {...line} /> : null}
      {tone === "true" || tone === "approved" ? <path d="M0 10.500H100" strokeWidth="3" {...line} /> : null}
      {tone === "hold" ? (
        <path d="M0 10.500H100M94 10.500C96 9 97 7 97.500 5" strokeWidth="3" {...line} />
      ) : null}
      {tone === "in-hand" ? <path d="M0 9.500H100" strokeWidth="5" {...line} /> : null}
      {tone === "empty" ? <path d="M0 10.500H100" strokeWidth="2" strokeDasharray="9 7" {...line} /> : null}
      {tone === "waiting" || tone === "kept" || tone === "unsent" ? (
        <path d="M0 10H100" strokeWidth="4" strokeDasharray="0.1 9" strokeLinecap="round" {...line} />
      ) : null}
    </svg>
  );
}

type Props = {
  tone: VerdictTone;
  sign: SignName;
  title: ReactNode;
  detail?: ReactNode;
  size?: "m" | "l";
  live?: boolean;
};

/** What the shop's numbers say, in words: sign, sentence, what it costs. A turn to not true is announced at once. */
export function Verdict({ tone, sign, title, detail, size = "m", live = false }: Props) {
  const big = size === "l";
  return (
    <div
      className={`relative flex items-center gap-4 ${big ? "px-5 pt-4 pb-5" : "px-4 pt-3 pb-4"} ${GROUND[tone]}`}
      role={live ? (tone === "not-true" || tone === "void" ? "alert" : "status") : undefined}
    >
      <Sign name={sign} size={big ? 52 : 36} />
      <div className="min-w-0">
        <p className={`font-semibold text-ink ${big ? "text-[27px] leading-tight" : "text-xl leading-snug"}`}>
          {title}
        </p>
        {detail ? (
          <p className={`text-concrete-700 ${big ? "mt-1 text-base" : "text-[15px]"}`}>{detail}</p>
        ) : null}
      </div>
      <Edge tone={tone} />
    </div>
  );
}
