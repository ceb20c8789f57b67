import { formOf, readForm } from "~/http/form.server";
import { answer, serviceContext } from "~/http/request.server";
import { assignPerson } from "~/services/assign-person.server";
import { AssignPersonForm } from "~/validation/floor";
import type { Route } from "./+types/assign-person";

export async function action({ request, context }: Route.ActionArgs) {
  const form = await formOf(request);
  return answer(form, () => assignPerson(serviceContext(context), readForm(form, AssignPersonForm)));
}
