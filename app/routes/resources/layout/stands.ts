import { answer, idParam, serviceContext } from "~/http/request.server";
import { acknowledgeStands } from "~/services/layouts/acknowledge-stands.server";
import type { Route } from "./+types/stands";

export async function action({ request, params, context }: Route.ActionArgs) {
  return answer(await request.formData(), () =>
    acknowledgeStands(serviceContext(context), idParam(params.layoutId)),
  );
}
