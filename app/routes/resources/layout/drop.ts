import { formOf } from "~/http/form.server";
import { measuringContext, readOr } from "~/http/layout-form.server";
import { answer, idParam } from "~/http/request.server";
import { keepDrop } from "~/services/layouts/keep-drop.server";
import { readDropForm } from "~/validation/layout";
import type { Route } from "./+types/drop";

export async function action({ request, params, context }: Route.ActionArgs) {
  const form = await formOf(request);
  return answer(form, async () => {
    const { ctx, unit } = await measuringContext(context);
    return keepDrop(ctx, idParam(params.layoutId), readOr(readDropForm(form, unit)));
  });
}
