import { data, Form, Link, redirect, useNavigation } from "react-router";
import { Shell } from "~/components/frame/shell";
import { appContext } from "~/context";
import { readAsked } from "~/db/queries/builds.server";
import { readShop } from "~/db/queries/shop.server";
import { formOf, readForm } from "~/http/form.server";
import { answer, idParam, requireActor, serviceContext } from "~/http/request.server";
import { readShell } from "~/http/shell.server";
import { changeAsked } from "~/services/change-asked.server";
import { Button } from "~/ui/button";
import { Field, TextAreaField } from "~/ui/field";
import { Tape } from "~/ui/tape";
import { askedForm } from "~/validation/book-in";
import type { Route } from "./+types/asked";

export const meta: Route.MetaFunction = () => [{ title: "What was asked for · Plumbay" }];

export async function loader({ params, context }: Route.LoaderArgs) {
  const actor = requireActor(context, "builds:book-in");
  const asked = await readAsked(context.get(appContext).db, actor.shopId, idParam(params.buildId));
  if (!asked) throw data({ message: "There is no such build." }, { status: 404 });
  return { shell: await readShell(context, actor), asked };
}

export async function action({ request, params, context }: Route.ActionArgs) {
  const actor = requireActor(context, "builds:book-in");
  const buildId = idParam(params.buildId);
  const form = await formOf(request);
  const { unit } = await readShop(context.get(appContext).db, actor.shopId);
  const came = await answer(form, () =>
    changeAsked(serviceContext(context), buildId, readForm(form, askedForm(unit))),
  );
  if (came.data.ok) throw redirect(`/builds/${buildId}`);
  return came;
}

export default function AskedPage({ loaderData, actionData }: Route.ComponentProps) {
  const { shell, asked } = loaderData;
  const busy = useNavigation().state === "submitting";
  const refused = actionData && !actionData.ok ? actionData : null;
  const field = (name: keyof typeof asked.fields) => ({
    name,
    defaultValue: refused?.typed[name] ?? asked.fields[name],
    error: refused?.fields[name],
  });
  return (
    <Shell shell={shell}>
      <main className="mx-auto grid w-full max-w-3xl gap-6 p-6">
        <div className="flex flex-wrap items-center justify-between gap-4">
          <Tape name={asked.nickname} code={asked.code} />
          <Link className="font-medium text-line underline" to={`/builds/${asked.buildId}`}>
            To the build
          </Link>
        </div>
        <h1 className="font-label text-3xl font-semibold">What was measured and asked for</h1>
        <p className="text-concrete-700">
          A layout under way reckons with these at once. Loaded radius: axle centre to the ground with the
          vehicle on its wheels.
        </p>
        {refused ? (
          <p role="alert" className="border-l-4 border-oxide bg-oxide-wash px-4 py-3 font-medium text-oxide">
            {refused.message}
          </p>
        ) : null}
        <Form method="post" className="grid gap-5" aria-label="What was measured and asked for">
          <TextAreaField label="In the customer's words" rows={3} {...field("wanted")} />
          <div className="grid gap-5 sm:grid-cols-2">
            <Field label="Tyres" hint="Such as 35 × 12.5" {...field("tyre")} />
            <Field label="Loaded radius" {...field("loadedRadius")} />
            <Field label="Tyre radius" hint="Half its diameter" {...field("tyreRadius")} />
            <Field label="Tyre width" {...field("tyreWidth")} />
            <Field label="Wheelbase" hint="As it came" {...field("wheelbase")} />
            <Field label="Approach at least" hint="Whole degrees" {...field("approach")} />
          </div>
          <div>
            <Button tone="go" size="l" type="submit" busy={busy}>
              Put it right
            </Button>
          </div>
        </Form>
      </main>
    </Shell>
  );
}
