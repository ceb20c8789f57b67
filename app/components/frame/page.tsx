import type { ReactNode } from "react";

/** A page of lists or forms: its name, what can be done, then the rest. */
export function PageFrame({
  title,
  actions,
  children,
  wide = false,
}: {
  title: string;
  actions?: ReactNode;
  children: ReactNode;
  wide?: boolean;
}) {
  return (
    <main
      className={`mx-auto grid w-full content-start gap-6 p-4 md:p-6 ${wide ? "max-w-7xl" : "max-w-5xl"}`}
    >
      <div className="flex flex-wrap items-center justify-between gap-3">
        <h1 className="font-label text-3xl font-semibold">{title}</h1>
        {actions ? <div className="flex flex-wrap gap-3">{actions}</div> : null}
      </div>
      {children}
    </main>
  );
}
