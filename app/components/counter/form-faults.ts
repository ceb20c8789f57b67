import type { z } from "zod";

/** What is wrong with a form by its schema, one sentence a field; the server reads by the same schema. */
export function faultsOf(form: FormData, schema: z.ZodType): Record<string, string> {
  const raw: Record<string, string> = {};
  for (const [name, value] of form) if (typeof value === "string") raw[name] = value;
  const faults: Record<string, string> = {};
  for (const issue of schema.safeParse(raw).error?.issues ?? [])
    faults[issue.path.join(".") || "form"] ??= issue.message;
  return faults;
}
