import { formOf } from "~/http/form.server";
import { measuringContext, readOr } from "~/http/layout-form.server";
import { answer, idParam } from "~/http/request.server";
import { keepTackCheck } from "~/services/layouts/keep-tack-check.server";
import { readTackForm } from "~/validation/layout-work";
import type { Route } from "./+types/tack";

export async function action({ request, params, context }: Route.ActionArgs) {
  const form = await formOf(request);
  return answer(form, async () => {
    const { ctx, unit } = await measuringContext(context);
    return keepTackCheck(ctx, idParam(params.layoutId), readOr(readTackForm(form, unit)));
  });
}
