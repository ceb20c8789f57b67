import { Form, Link, useNavigation } from "react-router";
import { may } from "~/auth/permissions";
import { Shell } from "~/components/frame/shell";
import { appContext } from "~/context";
import { readShop } from "~/db/queries/shop.server";
import { formatLength, mm } from "~/domain/units/length";
import { formOf, readForm } from "~/http/form.server";
import { answer, requireActor, serviceContext } from "~/http/request.server";
import { readShell } from "~/http/shell.server";
import { changeSetup } from "~/services/change-setup.server";
import { Button } from "~/ui/button";
import { Field, SelectField } from "~/ui/field";
import { SetupForm } from "~/validation/setup";
import type { Route } from "./+types/setup";

export const meta: Route.MetaFunction = () => [{ title: "Setup · Plumbay" }];

export async function loader({ context }: Route.LoaderArgs) {
  const actor = requireActor(context, "setup:see");
  const { db } = context.get(appContext);
  const shop = await readShop(db, actor.shopId);
  const words = (value: number, denominator: 16 | 32 | 64 = 32) =>
    formatLength(mm(value), shop.unit, { denominator });
  return {
    shell: await readShell(context, actor),
    mayEdit: may(actor.role, "setup:edit"),
    values: {
      name: shop.name,
      timeZone: shop.timeZone,
      unit: shop.unit,
      allowedSlopeDeg: String(shop.allowedSlopeDeg),
      shim: words(shop.shimMm),
      redropTolerance: words(shop.redropToleranceMm),
      markTolerance: words(shop.markToleranceMm),
      tapeSigma: words(shop.tapeSigmaMm, 64),
      dropSigma: words(shop.dropSigmaMm, 64),
      springSigma: words(shop.springSigmaMm, 64),
    } as Record<string, string>,
  };
}

export async function action({ request, context }: Route.ActionArgs) {
  const form = await formOf(request);
  return answer(form, async () => {
    const ctx = serviceContext(context);
    const shop = await readShop(ctx.db, ctx.actor.shopId);
    const read = readForm(form, SetupForm(shop.unit));
    return changeSetup(ctx, {
      name: read.name,
      timeZone: read.timeZone,
      unit: read.unit,
      allowedSlopeDeg: read.allowedSlopeDeg,
      shimMm: read.shim,
      redropToleranceMm: read.redropTolerance,
      markToleranceMm: read.markTolerance,
      tapeSigmaMm: read.tapeSigma,
      dropSigmaMm: read.dropSigma,
      springSigmaMm: read.springSigma,
    });
  });
}

export default function Setup({ loaderData, actionData }: Route.ComponentProps) {
  const { shell, values, mayEdit } = loaderData;
  const busy = useNavigation().state === "submitting";
  const refused = actionData && !actionData.ok ? actionData : null;
  const field = (name: string) => ({
    name,
    defaultValue: refused?.typed[name] ?? values[name],
    error: refused?.fields[name],
    disabled: !mayEdit,
  });
  return (
    <Shell shell={shell}>
      <main className="mx-auto w-full max-w-4xl p-6">
        <div className="flex items-baseline justify-between gap-4">
          <h1 className="font-label text-3xl font-semibold">Setup</h1>
          <nav className="flex gap-5" aria-label="More of Setup">
            <Link className="font-medium text-line underline" to="/devices">
              Displays
            </Link>
            {mayEdit ? (
              <Link className="font-medium text-line underline" to="/tokens">
                Tokens
              </Link>
            ) : null}
          </nav>
        </div>
        {mayEdit ? null : <p className="mt-2 text-concrete-700">Only the owner changes these.</p>}
        <Form method="post" className="mt-6 grid gap-8" key={shell.now}>
          <fieldset className="grid gap-4 md:grid-cols-3">
            <legend className="label mb-3">The shop</legend>
            <Field label="Name" {...field("name")} />
            <Field label="Time zone" hint="As in America/Boise" {...field("timeZone")} />
            <SelectField label="A bare number is in" {...field("unit")}>
              <option value="in">inches</option>
              <option value="mm">millimetres</option>
            </SelectField>
          </fieldset>
          <fieldset className="grid gap-4 md:grid-cols-3">
            <legend className="label mb-3">Level</legend>
            <Field
              label="Slope allowed, degrees"
              hint="Either way. 0.1 is common practice."
              {...field("allowedSlopeDeg")}
            />
            <Field label="Smallest shim" {...field("shim")} />
            <Field
              label="Old drops stand within"
              hint="When one is dropped again after a new level."
              {...field("redropTolerance")}
            />
            <Field
              label="Control marks within"
              hint="A to B as taped against what is set."
              {...field("markTolerance")}
            />
          </fieldset>
          <fieldset className="grid gap-4 md:grid-cols-3">
            <legend className="label mb-3">How sure a reading is (one standard deviation)</legend>
            <Field label="Tape" {...field("tapeSigma")} />
            <Field label="Bob settling" {...field("dropSigma")} />
            <Field label="Spring on the bench" {...field("springSigma")} />
          </fieldset>
          {mayEdit ? (
            <div className="flex items-center gap-4">
              <Button tone="go" size="m" type="submit" busy={busy}>
                Keep these
              </Button>
              <p role="status" className={refused ? "text-oxide" : "text-moss"}>
                {refused?.message ?? (actionData?.ok ? actionData.words : "")}
              </p>
            </div>
          ) : null}
        </Form>
      </main>
    </Shell>
  );
}
