import { type ReactNode, useEffect, useId, useRef } from "react";
import { Sign, type SignName } from "./sign";

type Props = {
  open: boolean;
  onClose: () => void;
  title: string;
  sign?: SignName;
  tone?: "plain" | "ask" | "stop";
  children?: ReactNode;
  actions: ReactNode;
};

const TONE = { plain: "text-ink", ask: "text-brass-ink", stop: "text-oxide" } as const;

/** A question over the page. Esc and a press beside it close; the element marked `data-autofocus` (the safe answer) has focus. */
export function Dialog({ open, onClose, title, sign, tone = "plain", children, actions }: Props) {
  const ref = useRef<HTMLDialogElement>(null);
  const titleId = useId();
  useEffect(() => {
    const dialog = ref.current;
    if (!dialog) return;
    if (open && !dialog.open) {
      dialog.showModal();
      dialog.querySelector<HTMLElement>("[data-autofocus]")?.focus();
    } else if (!open && dialog.open) dialog.close();
  }, [open]);
  return (
    <dialog
      ref={ref}
      aria-labelledby={titleId}
      className="m-auto w-[min(92vw,30rem)] rounded border border-concrete-700 bg-chalk p-0 text-ink shadow-lift backdrop:bg-ink/30"
      onCancel={(event) => {
        event.preventDefault();
        onClose();
      }}
      onClose={() => {
        if (open) onClose();
      }}
    >
      <div className="grid gap-4 p-5">
        <h2 id={titleId} className={`flex items-center gap-2 text-xl font-semibold ${TONE[tone]}`}>
          {sign ? <Sign name={sign} size={24} /> : null}
          {title}
        </h2>
        {children}
        <div className="flex flex-wrap gap-3">{actions}</div>
      </div>
    </dialog>
  );
}
