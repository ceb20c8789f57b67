import { data, redirect } from "react-router";
import { makeAuthenticator, SignInRefused, SignInSlowedDown } from "~/auth/authenticator.server";
import { sessionCookie } from "~/auth/cookie.server";
import { endSession, startSession } from "~/auth/sessions.server";
import { SignInPage } from "~/components/sign-in/sign-in-page";
import { actorContext, appContext, tooManyContext } from "~/context";
import { readDemoShop } from "~/db/queries/sign-in.server";
import { formOf } from "~/http/form.server";
import { safeReturn } from "~/http/request.server";
import type { Route } from "./+types/sign-in";

export const meta: Route.MetaFunction = () => [{ title: "Sign in · Plumbay" }];

export async function loader({ context }: Route.LoaderArgs) {
  const actor = context.get(actorContext);
  return {
    signedIn: actor?.personId ? actor.name : null,
    demoShop: await readDemoShop(context.get(appContext).db),
  };
}

/** `?to=`: where to go on to. A session that this browser had is ended: every sign-in gets a new one. */
export async function action({ request, context }: Route.ActionArgs) {
  const { db, now, dropSession } = context.get(appContext);
  const typed = String((await formOf(request.clone())).get("email") ?? "").slice(0, 190);
  if (context.get(tooManyContext))
    return data(
      { message: "Too many tries from this address. Wait a minute.", email: typed },
      { status: 429 },
    );
  const to = safeReturn(new URL(request.url).searchParams.get("to"));
  try {
    const { personId, shopId } = await makeAuthenticator(db, now).authenticate("form", request);
    const before = context.get(actorContext);
    if (before) {
      await endSession(db, before.sessionHash, now());
      dropSession(before.sessionHash);
    }
    const userAgent = request.headers.get("user-agent") ?? "";
    const secret = await startSession(
      db,
      { shopId, personId, deviceId: before?.deviceId ?? null, userAgent },
      now(),
    );
    throw redirect(to, {
      headers: { "Set-Cookie": await sessionCookie().serialize(secret) },
    });
  } catch (error) {
    if (!(error instanceof SignInRefused)) throw error;
    return data(
      { message: error.message, email: typed },
      { status: error instanceof SignInSlowedDown ? 429 : 400 },
    );
  }
}

export default function SignIn({ loaderData, actionData }: Route.ComponentProps) {
  return <SignInPage {...loaderData} refused={actionData ?? null} />;
}
