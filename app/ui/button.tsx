import type { ButtonHTMLAttributes } from "react";
import { Bob } from "./bob";
import { Sign, type SignName } from "./sign";

export type ButtonTone = "go" | "plain" | "quiet" | "stop" | "ink";
export type ButtonSize = "s" | "m" | "l" | "xl";

const TONE: Record<ButtonTone, string> = {
  go: "border-brass-ink bg-brass-ink font-semibold text-chalk shadow-[inset_0_-4px_0_var(--brass)] hover:bg-[#6f4909]",
  plain: "border-paint-edge bg-chalk font-semibold text-ink hover:bg-white",
  quiet: "border-transparent bg-transparent font-medium text-ink hover:bg-concrete-200",
  stop: "border-oxide bg-chalk font-semibold text-oxide hover:bg-oxide-wash",
  ink: "border-ink bg-ink font-semibold text-chalk hover:bg-concrete-700",
};
const SIZE: Record<ButtonSize, string> = {
  s: "min-h-8 px-3 text-sm",
  m: "min-h-11 px-4 text-base",
  l: "min-h-14 px-5 text-lg",
  xl: "min-h-26 px-6 text-2xl",
};

/** The classes of a button, for links that look like one. */
export const buttonClass = (tone: ButtonTone = "plain", size: ButtonSize = "m") =>
  `inline-flex items-center justify-center gap-2 rounded border-[1.5px] text-center leading-tight no-underline select-none disabled:cursor-not-allowed disabled:opacity-50 ${TONE[tone]} ${SIZE[size]}`;

type Props = ButtonHTMLAttributes<HTMLButtonElement> & {
  tone?: ButtonTone;
  size?: ButtonSize;
  busy?: boolean;
  sign?: SignName;
};

/** A plate to press. While busy it keeps its width, swings the bob and takes no second press. */
export function Button({
  tone = "plain",
  size = "m",
  busy = false,
  sign,
  className = "",
  children,
  disabled,
  type = "button",
  ...rest
}: Props) {
  return (
    <button
      type={type}
      className={`${buttonClass(tone, size)} ${className}`}
      disabled={disabled || busy}
      aria-busy={busy || undefined}
      {...rest}
    >
      {busy ? (
        <Bob size={24} swinging />
      ) : sign ? (
        <Sign name={sign} size={size === "s" ? 16 : size === "xl" ? 32 : 20} />
      ) : null}
      {children}
    </button>
  );
}
