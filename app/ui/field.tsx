import {
  type InputHTMLAttributes,
  type ReactNode,
  type SelectHTMLAttributes,
  type TextareaHTMLAttributes,
  useId,
} from "react";

type Common = { label: string; hint?: ReactNode; error?: string; scale?: "desk" | "tablet" };

const BOX =
  "w-full rounded border-[1.5px] border-paint-edge bg-chalk px-3 text-ink aria-invalid:border-oxide aria-invalid:bg-oxide-wash disabled:bg-concrete-100 disabled:text-concrete-700";
const scaleClass = (scale: Common["scale"]) =>
  scale === "tablet" ? "min-h-14 text-2xl" : "min-h-11 text-base";

function Frame({ label, hint, error, id, children }: Common & { id: string; children: ReactNode }) {
  return (
    <div className="grid content-start gap-1">
      <label htmlFor={id} className="font-medium">
        {label}
      </label>
      {children}
      {hint ? (
        <p id={`${id}-hint`} className="text-sm text-concrete-500">
          {hint}
        </p>
      ) : null}
      {error ? (
        <p id={`${id}-error`} className="text-sm font-medium text-oxide">
          {error}
        </p>
      ) : null}
    </div>
  );
}

const described = (id: string, hint: ReactNode, error?: string) =>
  [hint ? `${id}-hint` : "", error ? `${id}-error` : ""].filter(Boolean).join(" ") || undefined;

/** An input with its label, a hint, and what is wrong with it in words, tied together for screen readers. */
export function Field({
  label,
  hint,
  error,
  scale,
  className = "",
  ...input
}: Common & InputHTMLAttributes<HTMLInputElement>) {
  const made = useId();
  const id = input.id ?? made;
  return (
    <Frame label={label} hint={hint} error={error} id={id}>
      <input
        {...input}
        id={id}
        className={`${BOX} ${scaleClass(scale)} ${className}`}
        aria-invalid={error ? true : undefined}
        aria-describedby={described(id, hint, error)}
      />
    </Frame>
  );
}

export function SelectField({
  label,
  hint,
  error,
  scale,
  className = "",
  children,
  ...select
}: Common & SelectHTMLAttributes<HTMLSelectElement>) {
  const made = useId();
  const id = select.id ?? made;
  return (
    <Frame label={label} hint={hint} error={error} id={id}>
      <select
        {...select}
        id={id}
        className={`${BOX} ${scaleClass(scale)} ${className}`}
        aria-invalid={error ? true : undefined}
        aria-describedby={described(id, hint, error)}
      >
        {children}
      </select>
    </Frame>
  );
}

export function TextAreaField({
  label,
  hint,
  error,
  scale,
  className = "",
  ...area
}: Common & TextareaHTMLAttributes<HTMLTextAreaElement>) {
  const made = useId();
  const id = area.id ?? made;
  return (
    <Frame label={label} hint={hint} error={error} id={id}>
      <textarea
        rows={3}
        {...area}
        id={id}
        className={`${BOX} py-2 ${scaleClass(scale)} ${className}`}
        aria-invalid={error ? true : undefined}
        aria-describedby={described(id, hint, error)}
      />
    </Frame>
  );
}

/** Everything that is wrong with a form, in one place above it; announced when it appears. */
export function ErrorSummary({ problems }: { problems: readonly string[] }) {
  if (problems.length === 0) return null;
  return (
    <div role="alert" className="rounded border-[1.5px] border-oxide bg-oxide-wash p-3 text-oxide">
      <p className="font-semibold">
        {problems.length === 1
          ? "One thing is not right yet:"
          : `${problems.length} things are not right yet:`}
      </p>
      <ul className="mt-1 list-inside list-disc">
        {problems.map((words) => (
          <li key={words}>{words}</li>
        ))}
      </ul>
    </div>
  );
}
