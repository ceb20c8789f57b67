import { formOf, readForm } from "~/http/form.server";
import { answer, idParam, serviceContext } from "~/http/request.server";
import { approveOption } from "~/services/layouts/approve-option.server";
import { ApproveForm } from "~/validation/layout";
import type { Route } from "./+types/approve";

export async function action({ request, params, context }: Route.ActionArgs) {
  const form = await formOf(request);
  return answer(form, () =>
    approveOption(serviceContext(context), idParam(params.layoutId), readForm(form, ApproveForm).key || null),
  );
}
