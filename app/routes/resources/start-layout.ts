import { formOf, readForm } from "~/http/form.server";
import { answer, idParam, serviceContext } from "~/http/request.server";
import { startLayout } from "~/services/layouts/start-layout.server";
import { StartLayoutForm } from "~/validation/layout";
import type { Route } from "./+types/start-layout";

export async function action({ request, params, context }: Route.ActionArgs) {
  const form = await formOf(request);
  return answer(form, () =>
    startLayout(serviceContext(context), {
      buildId: idParam(params.buildId),
      ...readForm(form, StartLayoutForm),
    }),
  );
}
