import { formOf } from "~/http/form.server";
import { answer, serviceContext } from "~/http/request.server";
import { undoFloor } from "~/services/undo-floor.server";
import type { Route } from "./+types/undo-floor";

export async function action({ request, context }: Route.ActionArgs) {
  return answer(await formOf(request), () => undoFloor(serviceContext(context)));
}
