import { Form, Link, useNavigation } from "react-router";
import { z } from "zod";
import { Shell } from "~/components/frame/shell";
import { appContext, tooManyContext } from "~/context";
import { formOf, readForm } from "~/http/form.server";
import { answer, requireActor, serviceContext } from "~/http/request.server";
import { readShell } from "~/http/shell.server";
import { Refusal } from "~/services/errors";
import { confirmPairing, listDevices, revokeDevice } from "~/services/pair-device.server";
import { Button } from "~/ui/button";
import { Field, SelectField } from "~/ui/field";
import { idField } from "~/validation/floor";
import { PairForm } from "~/validation/setup";
import type { Route } from "./+types/devices";

export const meta: Route.MetaFunction = () => [{ title: "Displays · Plumbay" }];

export async function loader({ context }: Route.LoaderArgs) {
  const actor = requireActor(context, "devices:pair");
  const { db } = context.get(appContext);
  const shell = await readShell(context, actor);
  const devices = await listDevices(db, actor.shopId);
  const day = new Intl.DateTimeFormat("en-GB", { dateStyle: "medium", timeZone: shell.timeZone });
  return { shell, devices: devices.map((device) => ({ ...device, pairedAt: day.format(device.pairedAt) })) };
}

const Revoke = z.object({ deviceId: idField });

export async function action({ request, context }: Route.ActionArgs) {
  const form = await formOf(request);
  return answer(form, async () => {
    if (context.get(tooManyContext))
      throw new Refusal("too-many", "Too many codes from this address. Wait a minute.");
    const ctx = serviceContext(context);
    if (form.get("do") !== "revoke") return confirmPairing(ctx, readForm(form, PairForm));
    const { words, sessionHashes } = await revokeDevice(ctx, readForm(form, Revoke).deviceId);
    const { dropSession } = context.get(appContext);
    for (const hash of sessionHashes) dropSession(hash);
    return { words };
  });
}

export default function Devices({ loaderData, actionData }: Route.ComponentProps) {
  const { shell, devices } = loaderData;
  const busy = useNavigation().state === "submitting";
  const refused = actionData && !actionData.ok ? actionData : null;
  return (
    <Shell shell={shell}>
      <main className="mx-auto grid w-full max-w-4xl gap-8 p-6">
        <div className="flex items-baseline justify-between gap-4">
          <h1 className="font-label text-3xl font-semibold">Displays</h1>
          <Link className="font-medium text-line underline" to="/setup">
            Setup
          </Link>
        </div>
        <section className="grid gap-4" aria-labelledby="pair-head">
          <h2 id="pair-head" className="label">
            Pair a display
          </h2>
          <p>
            On the display, open <b>/pair</b> in its browser. It shows a code: type it here. Never pair a
            display that you do not see.
          </p>
          <Form
            method="post"
            className="grid items-start gap-4 md:grid-cols-[2fr_2fr_1fr_auto]"
            key={refused ? "again" : devices.length}
          >
            <Field
              label="Code on the display"
              name="code"
              autoComplete="off"
              defaultValue={refused?.typed.code}
              error={refused?.fields.code}
            />
            <Field
              label="Name"
              name="name"
              hint="Such as: Wall by the door"
              defaultValue={refused?.typed.name}
              error={refused?.fields.name}
            />
            <SelectField label="Kind" name="kind" defaultValue={refused?.typed.kind ?? "wall"}>
              <option value="wall">Wall</option>
              <option value="post">Post</option>
            </SelectField>
            <div className="pt-6">
              <Button tone="go" size="m" type="submit" busy={busy}>
                Pair it
              </Button>
            </div>
          </Form>
          <p role="status" className={refused ? "text-oxide" : "text-moss"}>
            {refused?.message ?? (actionData?.ok ? actionData.words : "")}
          </p>
        </section>
        <section className="grid gap-2" aria-labelledby="paired-head">
          <h2 id="paired-head" className="label">
            Paired
          </h2>
          {devices.length === 0 ? <p>No display is paired yet.</p> : null}
          <ul className="divide-y divide-concrete-200 border-y border-concrete-200">
            {devices.map((device) => (
              <li key={device.id} className="flex items-center gap-4 py-3">
                <b className="font-semibold">{device.name}</b>
                <span className="text-concrete-500">
                  {device.kind === "wall" ? "Wall" : "Post"}, paired {device.pairedAt}
                </span>
                <Form method="post" className="ml-auto">
                  <input type="hidden" name="do" value="revoke" />
                  <input type="hidden" name="deviceId" value={device.id} />
                  <Button tone="stop" size="s" type="submit" aria-label={`Let ${device.name} go`}>
                    Let go
                  </Button>
                </Form>
              </li>
            ))}
          </ul>
        </section>
      </main>
    </Shell>
  );
}
