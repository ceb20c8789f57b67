import { formOf, readForm } from "~/http/form.server";
import { answer, idParam, serviceContext } from "~/http/request.server";
import { setStage } from "~/services/set-stage.server";
import { SetStageForm } from "~/validation/floor";
import type { Route } from "./+types/set-stage";

export async function action({ request, params, context }: Route.ActionArgs) {
  const buildId = idParam(params.buildId);
  const form = await formOf(request);
  return answer(form, () => setStage(serviceContext(context), { buildId, ...readForm(form, SetStageForm) }));
}
