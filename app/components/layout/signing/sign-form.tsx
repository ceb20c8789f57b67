import type { LayoutView } from "../../../domain/layout/view";
import { ALIGNMENT_FIGURES, type WorkKind, type WorkLine } from "../../../domain/layout/work-list";
import { Button } from "../../../ui/button";
import { Field } from "../../../ui/field";
import { useDraft } from "../use-draft";
import { usePost } from "../use-post";

const SIGN: Record<WorkKind, string> = {
  ready: "Ready: sign",
  weld: "Welded: sign",
  bolt: "Torqued: sign",
  check: "Good: sign",
  figures: "Read: sign",
  "sign-off": "Sign off",
};

type FieldSpec = { name: string; label: string; hint?: string; type?: "date"; carried?: true };

/** What is typed with a line. What the next line will most likely want again is carried over to it. */
const FIELDS: Record<WorkKind, readonly FieldSpec[]> = {
  ready: [],
  weld: [{ name: "tool", label: "Qualified by", hint: "As on your card.", carried: true }],
  bolt: [
    { name: "wanted", label: "Asked for", hint: "From the parts maker's paper, with its unit." },
    { name: "read", label: "Read" },
    { name: "tool", label: "Wrench", carried: true },
    { name: "due", label: "Torque again by", type: "date", carried: true },
  ],
  check: [],
  figures: ALIGNMENT_FIGURES.map(({ id, label }) => ({ name: `figure.${id}`, label: `${label}, °` })),
  "sign-off": [],
};

type Props = {
  view: LayoutView;
  line: WorkLine;
  person: string;
  isSigned: boolean;
  done: () => void;
  signed: () => void;
};

/** The signature of the person in hand: as good, or as not, with why. A signed line can only be taken back. */
export function SignForm({ view, line, person, isSigned, done, signed }: Props) {
  const { draft, change, reset } = useDraft(`plumbay.layout.${view.id}.work.${line.id}`, { words: "" });
  const carried = useDraft(`plumbay.work.${line.kind}.${person}`, {});
  const sending = usePost(done);
  const fields = isSigned ? [] : FIELDS[line.kind];
  const typedIn = ({ name, carried: over }: FieldSpec) => (over ? carried.draft[name] : draft[name]) ?? "";
  const sign = async (state: "pass" | "fail") => {
    const answer = await sending.send(`/layouts/${view.id}/work`, {
      item: line.id,
      state,
      words: draft.words ?? "",
      ...Object.fromEntries(fields.map((field) => [field.name, typedIn(field)])),
    });
    if (!answer?.ok) return;
    reset({ words: "" });
    if (state === "pass") signed();
  };
  const beside = [...fields.map((field) => field.name), "words"];
  const trouble = Object.keys(sending.fields).some((name) => beside.includes(name)) ? null : sending.trouble;
  return (
    <form
      className="grid gap-3"
      onSubmit={(event) => {
        event.preventDefault();
        if (!isSigned) void sign("pass");
      }}
    >
      {fields.length > 0 ? (
        <div className="work-fields">
          {fields.map((field) => (
            <Field
              key={field.name}
              label={field.label}
              name={field.name}
              type={field.type ?? "text"}
              hint={field.hint}
              scale="tablet"
              autoComplete="off"
              value={typedIn(field)}
              error={sending.fields[field.name]}
              onChange={(event) =>
                (field.carried ? carried.change : change)({ [field.name]: event.target.value })
              }
            />
          ))}
        </div>
      ) : null}
      <Field
        label={isSigned ? "Why it is taken back" : "Words"}
        name="words"
        hint={isSigned ? undefined : "Needed when it is not good."}
        scale="tablet"
        autoComplete="off"
        maxLength={200}
        value={draft.words ?? ""}
        error={sending.fields.words}
        onChange={(event) => change({ words: event.target.value })}
      />
      {trouble ? (
        <p role="alert" className="font-medium text-oxide">
          {trouble}
        </p>
      ) : null}
      <div className="work-buttons">
        {isSigned ? null : (
          <Button tone="go" size="xl" type="submit" busy={sending.busy}>
            <span>
              {SIGN[line.kind]}
              <small>as {person}</small>
            </span>
          </Button>
        )}
        <Button
          tone="stop"
          size={isSigned ? "l" : "xl"}
          busy={sending.busy}
          onClick={() => void sign("fail")}
        >
          {isSigned ? "Take it back" : "Not good"}
        </Button>
      </div>
    </form>
  );
}
