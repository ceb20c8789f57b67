import { formOf } from "~/http/form.server";
import { measuringContext, readOr } from "~/http/layout-form.server";
import { answer, idParam } from "~/http/request.server";
import { takeSecondLook } from "~/services/layouts/take-second-look.server";
import { readLookForm } from "~/validation/layout";
import type { Route } from "./+types/look";

export async function action({ request, params, context }: Route.ActionArgs) {
  const form = await formOf(request);
  return answer(form, async () => {
    const { ctx, unit } = await measuringContext(context);
    return takeSecondLook(ctx, idParam(params.layoutId), readOr(readLookForm(form, unit)));
  });
}
