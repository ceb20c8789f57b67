import { redirect } from "react-router";
import { sessionCookie } from "~/auth/cookie.server";
import { endSession } from "~/auth/sessions.server";
import { actorContext, appContext } from "~/context";
import type { Route } from "./+types/sign-out";

/** Ends the session in the database, cuts its live channel, takes the cookie back. */
export async function action({ context }: Route.ActionArgs) {
  const actor = context.get(actorContext);
  const { db, now, dropSession } = context.get(appContext);
  if (actor) {
    await endSession(db, actor.sessionHash, now());
    dropSession(actor.sessionHash);
  }
  throw redirect("/sign-in", {
    headers: { "Set-Cookie": await sessionCookie().serialize("", { maxAge: 0 }) },
  });
}
