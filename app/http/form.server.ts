import { data } from "react-router";
import type { z } from "zod";
import { Refusal } from "../services/errors";

/** More than any form of ours has; looking a field up takes longer with every one. */
const MOST_FIELDS = 400;

/** The form of a request. @throws 400 in words when the body is no form of ours: no screen sends such a thing */
export async function formOf(request: Request): Promise<FormData> {
  let form: FormData;
  try {
    form = await request.formData();
  } catch {
    throw data({ message: "What was sent cannot be read as a form." }, { status: 400 });
  }
  let fields = 0;
  for (const _ of form.keys())
    if (++fields > MOST_FIELDS)
      throw data({ message: "That form has more fields than any of ours." }, { status: 400 });
  return form;
}

/**
 * Reads a form by a schema. Repeated names become lists only where the schema's caller asks for them.
 * @throws Refusal invalid, with one sentence beside each field that is wrong
 */
export function readForm<S extends z.ZodType>(
  form: FormData,
  schema: S,
  lists: readonly string[] = [],
): z.output<S> {
  const raw: Record<string, unknown> = {};
  for (const name of new Set(form.keys())) {
    raw[name] = lists.includes(name) ? form.getAll(name).map(String) : String(form.get(name));
  }
  for (const name of lists) raw[name] ??= [];
  const result = schema.safeParse(raw, {
    error: (issue) =>
      issue.code === "invalid_type" ? "Something is missing here: load the page again." : undefined,
  });
  if (result.success) return result.data;
  const fields: Record<string, string> = {};
  for (const issue of result.error.issues) fields[issue.path.join(".") || "form"] ??= issue.message;
  throw new Refusal("invalid", Object.values(fields)[0] ?? "Something typed here cannot be used.", fields);
}
