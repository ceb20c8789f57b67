import { formOf } from "~/http/form.server";
import { answer, idParam, serviceContext } from "~/http/request.server";
import { acknowledgeStands } from "~/services/layouts/acknowledge-stands.server";
import type { Route } from "./+types/stands";

export async function action({ request, params, context }: Route.ActionArgs) {
  return answer(await formOf(request), () =>
    acknowledgeStands(serviceContext(context), idParam(params.layoutId)),
  );
}
