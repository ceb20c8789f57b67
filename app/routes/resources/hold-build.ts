import { formOf, readForm } from "~/http/form.server";
import { answer, serviceContext } from "~/http/request.server";
import { holdBuild } from "~/services/hold-build.server";
import { HoldForm } from "~/validation/floor";
import type { Route } from "./+types/hold-build";

export async function action({ request, context }: Route.ActionArgs) {
  const form = await formOf(request);
  return answer(form, () => {
    const hold = readForm(form, HoldForm);
    const place = hold.action === "place" ? { kind: hold.kind, words: hold.words, dueAt: null } : null;
    return holdBuild(serviceContext(context), { buildId: hold.buildId, place });
  });
}
