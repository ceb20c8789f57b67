import { useState } from "react";
import { Button } from "../../../ui/button";
import { Dialog } from "../../../ui/dialog";
import { Field } from "../../../ui/field";
import { usePost } from "../use-post";

const REASONS = [
  "A stand was touched",
  "The vehicle moved",
  "A heavy part went on or off",
  "Another day began",
];

/** The press that voids a level which is true: whoever touched a stand says so here, and what it was. */
export function VoidLevel({
  layoutId,
  dropsKept,
  done,
}: {
  layoutId: number;
  dropsKept: number;
  done: () => void;
}) {
  const [open, setOpen] = useState(false);
  const [reason, setReason] = useState(REASONS[0] ?? "");
  const { busy, trouble, fields, send } = usePost(done);
  const say = async () => {
    const answer = await send(`/layouts/${layoutId}/void-level`, { reason });
    if (answer?.ok) setOpen(false);
  };
  return (
    <>
      <Button tone="stop" size="l" sign="void" onClick={() => setOpen(true)}>
        A stand was touched
      </Button>
      <Dialog
        open={open}
        onClose={() => setOpen(false)}
        title="Void the level?"
        sign="void"
        tone="stop"
        actions={
          <>
            <Button size="l" data-autofocus onClick={() => setOpen(false)}>
              Leave it true
            </Button>
            <Button
              tone="stop"
              size="l"
              busy={busy}
              disabled={reason.trim() === ""}
              onClick={() => void say()}
            >
              Void the level
            </Button>
          </>
        }
      >
        <p>
          {dropsKept > 0 ? `${dropsKept} ${dropsKept === 1 ? "drop waits" : "drops wait"} then. ` : ""}The way
          back: level again, then drop one old point again. An approval under it is void as well.
        </p>
        <div className="grid gap-2 sm:grid-cols-2">
          {REASONS.map((words) => (
            <Button
              key={words}
              size="l"
              aria-pressed={reason === words}
              className={reason === words ? "border-brass-ink! bg-brass-wash!" : ""}
              onClick={() => setReason(words)}
            >
              {words.charAt(0).toUpperCase() + words.slice(1)}
            </Button>
          ))}
        </div>
        <Field
          label="What broke it"
          value={reason}
          maxLength={160}
          autoComplete="off"
          onChange={(event) => setReason(event.target.value)}
          error={fields.reason ?? trouble ?? undefined}
        />
      </Dialog>
    </>
  );
}
