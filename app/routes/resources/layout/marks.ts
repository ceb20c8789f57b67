import { formOf } from "~/http/form.server";
import { measuringContext, readOr } from "~/http/layout-form.server";
import { answer, idParam } from "~/http/request.server";
import { confirmMarks } from "~/services/layouts/confirm-marks.server";
import { readMarksForm } from "~/validation/layout";
import type { Route } from "./+types/marks";

export async function action({ request, params, context }: Route.ActionArgs) {
  const form = await formOf(request);
  return answer(form, async () => {
    const { ctx, unit } = await measuringContext(context);
    return confirmMarks(ctx, idParam(params.layoutId), readOr(readMarksForm(form, unit)));
  });
}
