import { Form, Link, useNavigation } from "react-router";
import { z } from "zod";
import { Shell } from "~/components/frame/shell";
import { dayAndDate, whenInWords } from "~/components/time";
import { appContext } from "~/context";
import { formOf, readForm } from "~/http/form.server";
import { answer, requireActor, serviceContext } from "~/http/request.server";
import { readShell } from "~/http/shell.server";
import { listTokens, makeToken, revokeToken } from "~/services/api-tokens.server";
import { Button } from "~/ui/button";
import { Field } from "~/ui/field";
import { idField } from "~/validation/floor";
import { TokenForm } from "~/validation/setup";
import type { Route } from "./+types/tokens";

export const meta: Route.MetaFunction = () => [{ title: "Tokens · Plumbay" }];

export async function loader({ context }: Route.LoaderArgs) {
  const actor = requireActor(context, "tokens:make");
  const shell = await readShell(context, actor);
  const tokens = await listTokens(context.get(appContext).db, actor.shopId);
  return {
    shell,
    tokens: tokens.map(({ madeAt, lastUsedAt, ...token }) => ({
      ...token,
      made: dayAndDate(madeAt, shell.timeZone),
      used: lastUsedAt ? whenInWords(lastUsedAt, shell.now, shell.timeZone) : null,
    })),
  };
}

const Revoke = z.object({ tokenId: idField });

export async function action({ request, context }: Route.ActionArgs) {
  const form = await formOf(request);
  return answer<{ words: string; token?: string }>(form, async () => {
    const ctx = serviceContext(context);
    if (form.get("do") === "revoke") return revokeToken(ctx, readForm(form, Revoke).tokenId);
    return makeToken(ctx, readForm(form, TokenForm).name);
  });
}

export default function Tokens({ loaderData, actionData }: Route.ComponentProps) {
  const { shell, tokens } = loaderData;
  const busy = useNavigation().state === "submitting";
  const refused = actionData && !actionData.ok ? actionData : null;
  const made = actionData?.ok ? actionData : null;
  return (
    <Shell shell={shell}>
      <main className="mx-auto grid w-full max-w-4xl gap-8 p-6">
        <div className="flex items-baseline justify-between gap-4">
          <h1 className="font-label text-3xl font-semibold">Tokens</h1>
          <Link className="font-medium text-line underline" to="/setup">
            Setup
          </Link>
        </div>
        <section className="grid gap-4" aria-labelledby="make-head">
          <h2 id="make-head" className="label">
            Make a token
          </h2>
          <p>
            A program of yours that asks Plumbay for{" "}
            <Link className="font-medium text-line underline" to="/api/docs">
              calculations
            </Link>{" "}
            shows a token. It can do that and nothing else: it sees no customer, vehicle or layout.
          </p>
          <Form
            method="post"
            className="grid items-start gap-4 md:grid-cols-[2fr_auto]"
            key={refused ? "again" : tokens.length}
          >
            <Field
              label="Name"
              name="name"
              hint="The program that will use it, such as: Spring rack sheet"
              defaultValue={refused?.typed.name}
              error={refused?.fields.name}
            />
            <div className="pt-6">
              <Button tone="go" size="m" type="submit" busy={busy}>
                Make it
              </Button>
            </div>
          </Form>
          {made?.token ? (
            <div role="status" className="grid gap-2 border-l-4 border-brass bg-brass-wash p-4">
              <p>
                <b className="font-semibold">{made.words}.</b> Copy it now: it is not shown again.
              </p>
              <output className="block overflow-x-auto font-mono text-base">{made.token}</output>
            </div>
          ) : (
            <p role="status" className={refused ? "text-oxide" : "text-moss"}>
              {refused?.message ?? made?.words ?? ""}
            </p>
          )}
        </section>
        <section className="grid gap-2" aria-labelledby="tokens-head">
          <h2 id="tokens-head" className="label">
            Good tokens
          </h2>
          {tokens.length === 0 ? <p>No token is out.</p> : null}
          <ul className="divide-y divide-concrete-200 border-concrete-200 border-y empty:hidden">
            {tokens.map((token) => (
              <li key={token.id} className="flex flex-wrap items-center gap-x-4 gap-y-1 py-3">
                <b className="font-semibold">{token.name}</b>
                <span className="text-concrete-500">
                  made {token.made} by {token.madeBy}, {token.used ? `used ${token.used}` : "never used"}
                </span>
                <Form method="post" className="ml-auto">
                  <input type="hidden" name="do" value="revoke" />
                  <input type="hidden" name="tokenId" value={token.id} />
                  <Button tone="stop" size="s" type="submit" aria-label={`Revoke ${token.name}`}>
                    Revoke
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
