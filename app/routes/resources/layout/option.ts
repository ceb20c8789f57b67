import { formOf, readForm } from "~/http/form.server";
import { answer, idParam, serviceContext } from "~/http/request.server";
import { chooseOption } from "~/services/layouts/choose-option.server";
import { OptionForm } from "~/validation/layout";
import type { Route } from "./+types/option";

export async function action({ request, params, context }: Route.ActionArgs) {
  const form = await formOf(request);
  return answer(form, () =>
    chooseOption(serviceContext(context), idParam(params.layoutId), readForm(form, OptionForm).key),
  );
}
