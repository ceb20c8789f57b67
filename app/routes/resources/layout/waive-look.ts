import { formOf } from "~/http/form.server";
import { readOr } from "~/http/layout-form.server";
import { answer, idParam, serviceContext } from "~/http/request.server";
import { waiveSecondLook } from "~/services/layouts/waive-second-look.server";
import { readWaiverForm } from "~/validation/layout";
import type { Route } from "./+types/waive-look";

export async function action({ request, params, context }: Route.ActionArgs) {
  const form = await formOf(request);
  return answer(form, () =>
    waiveSecondLook(serviceContext(context), idParam(params.layoutId), readOr(readWaiverForm(form))),
  );
}
