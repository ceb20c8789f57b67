import { redirect } from "react-router";
import { BookInForm } from "~/components/counter/book-in-form";
import { Shell } from "~/components/frame/shell";
import { appContext } from "~/context";
import { readCustomers } from "~/db/queries/builds.server";
import { readShop } from "~/db/queries/shop.server";
import { formOf, readForm } from "~/http/form.server";
import { answer, requireActor, serviceContext } from "~/http/request.server";
import { readShell } from "~/http/shell.server";
import { bookIn } from "~/services/book-in.server";
import { bookInForm } from "~/validation/book-in";
import type { Route } from "./+types/book-in";

export const meta: Route.MetaFunction = () => [{ title: "Book in · Plumbay" }];

export async function loader({ context }: Route.LoaderArgs) {
  const actor = requireActor(context, "builds:book-in");
  return {
    shell: await readShell(context, actor),
    customers: await readCustomers(context.get(appContext).db, actor.shopId),
  };
}

/** Booked in: on to the build, with its tag in sight. Refused: what was typed, with a sentence beside every field. */
export async function action({ request, context }: Route.ActionArgs) {
  const actor = requireActor(context, "builds:book-in");
  const { unit } = await readShop(context.get(appContext).db, actor.shopId);
  const form = await formOf(request);
  const result = await answer(form, () => bookIn(serviceContext(context), readForm(form, bookInForm(unit))));
  if (result.data.ok) throw redirect(`/builds/${result.data.buildId}?booked-in=1`);
  return result;
}

export default function BookIn({ loaderData, actionData }: Route.ComponentProps) {
  return (
    <Shell shell={loaderData.shell}>
      <BookInForm
        customers={loaderData.customers}
        unit={loaderData.shell.unit}
        refused={actionData && !actionData.ok ? actionData : null}
      />
    </Shell>
  );
}
