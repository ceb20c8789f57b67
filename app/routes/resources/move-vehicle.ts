import { formOf, readForm } from "~/http/form.server";
import { answer, serviceContext } from "~/http/request.server";
import { moveVehicle } from "~/services/move-vehicle.server";
import { MoveVehicleForm } from "~/validation/floor";
import type { Route } from "./+types/move-vehicle";

export async function action({ request, context }: Route.ActionArgs) {
  const form = await formOf(request);
  return answer(form, () => moveVehicle(serviceContext(context), readForm(form, MoveVehicleForm)));
}
