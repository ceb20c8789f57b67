import { formOf } from "~/http/form.server";
import { measuringContext, readOr } from "~/http/layout-form.server";
import { answer, idParam } from "~/http/request.server";
import { chooseAxleLine } from "~/services/layouts/choose-axle-line.server";
import { readAxleForm } from "~/validation/layout";
import type { Route } from "./+types/axle-line";

export async function action({ request, params, context }: Route.ActionArgs) {
  const form = await formOf(request);
  return answer(form, async () => {
    const { ctx, unit } = await measuringContext(context);
    return chooseAxleLine(ctx, idParam(params.layoutId), readOr(readAxleForm(form, unit)));
  });
}
