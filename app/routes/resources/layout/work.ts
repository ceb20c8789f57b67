import { formOf } from "~/http/form.server";
import { readOr } from "~/http/layout-form.server";
import { answer, idParam, serviceContext } from "~/http/request.server";
import { signWork } from "~/services/layouts/sign-work.server";
import { readWorkForm } from "~/validation/layout-work";
import type { Route } from "./+types/work";

export async function action({ request, params, context }: Route.ActionArgs) {
  const form = await formOf(request);
  return answer(form, () =>
    signWork(serviceContext(context), idParam(params.layoutId), readOr(readWorkForm(form))),
  );
}
