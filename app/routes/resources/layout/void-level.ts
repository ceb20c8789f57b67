import { formOf, readForm } from "~/http/form.server";
import { answer, idParam, serviceContext } from "~/http/request.server";
import { voidLevelByHand } from "~/services/layouts/void-level-by-hand.server";
import { VoidForm } from "~/validation/layout";
import type { Route } from "./+types/void-level";

export async function action({ request, params, context }: Route.ActionArgs) {
  const form = await formOf(request);
  return answer(form, () =>
    voidLevelByHand(serviceContext(context), idParam(params.layoutId), readForm(form, VoidForm).reason),
  );
}
