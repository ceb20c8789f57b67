import { redirect } from "react-router";
import { sessionCookie } from "~/auth/cookie.server";
import { endSession, startSession } from "~/auth/sessions.server";
import { actorContext, appContext } from "~/context";
import type { Route } from "./+types/sign-out";

/**
 * Ends the session in the database, cuts its live channel, takes the cookie back. A person who had signed in on a paired
 * display leaves it a display.
 */
export async function action({ request, context }: Route.ActionArgs) {
  const actor = context.get(actorContext);
  const { db, now, dropSession } = context.get(appContext);
  if (actor) {
    await endSession(db, actor.sessionHash, now());
    dropSession(actor.sessionHash);
  }
  if (actor?.deviceId && actor.personId !== null) {
    const { shopId, deviceId } = actor;
    const userAgent = request.headers.get("user-agent") ?? "";
    const secret = await startSession(db, { shopId, personId: null, deviceId, userAgent }, now());
    throw redirect("/wall", { headers: { "Set-Cookie": await sessionCookie().serialize(secret) } });
  }
  throw redirect("/sign-in", {
    headers: { "Set-Cookie": await sessionCookie().serialize("", { maxAge: 0 }) },
  });
}
