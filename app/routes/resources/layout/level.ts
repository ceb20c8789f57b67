import { formOf } from "~/http/form.server";
import { measuringContext, readOr } from "~/http/layout-form.server";
import { answer, idParam } from "~/http/request.server";
import { checkLevel } from "~/services/layouts/check-level.server";
import { readLevelForm } from "~/validation/layout";
import type { Route } from "./+types/level";

export async function action({ request, params, context }: Route.ActionArgs) {
  const form = await formOf(request);
  return answer(form, async () => {
    const { ctx, unit } = await measuringContext(context);
    return checkLevel(ctx, idParam(params.layoutId), readOr(readLevelForm(form, unit)));
  });
}
