import { useEffect } from "react";
import { data, redirect, useRevalidator } from "react-router";
import { pairingCookie, sessionCookie } from "~/auth/cookie.server";
import { appContext } from "~/context";
import { askForPairing, collectPairing } from "~/services/pair-device.server";
import { Bob } from "~/ui/bob";
import type { Route } from "./+types/pair";

export const meta: Route.MetaFunction = () => [{ title: "Pair this display · Plumbay" }];

type Claim = { claim: string; code: string; expiresAt: string };

const isClaim = (value: unknown): value is Claim =>
  typeof value === "object" && value !== null && "claim" in value && "code" in value && "expiresAt" in value;

/** Shows a code until a foreman has typed it in; then this display gets a session of its own, once. */
export async function loader({ request, context }: Route.LoaderArgs) {
  const { db, now } = context.get(appContext);
  const known: unknown = await pairingCookie().parse(request.headers.get("cookie"));
  if (isClaim(known)) {
    const secret = await collectPairing(db, known.claim, request.headers.get("user-agent") ?? "", now());
    if (secret) {
      const headers = new Headers();
      headers.append("Set-Cookie", await sessionCookie().serialize(secret));
      headers.append("Set-Cookie", await pairingCookie().serialize("", { maxAge: 0 }));
      throw redirect("/wall", { headers });
    }
    if (new Date(known.expiresAt) > now()) return data({ code: known.code });
  }
  const asked = await askForPairing(db, now());
  const claim: Claim = { ...asked, expiresAt: asked.expiresAt.toISOString() };
  return data({ code: asked.code }, { headers: { "Set-Cookie": await pairingCookie().serialize(claim) } });
}

/** How often the display asks whether it was confirmed. */
const ASK_EVERY_MS = 3000;

export default function Pair({ loaderData }: Route.ComponentProps) {
  const { revalidate, state } = useRevalidator();
  useEffect(() => {
    const timer = setInterval(() => {
      if (state === "idle") void revalidate();
    }, ASK_EVERY_MS);
    return () => clearInterval(timer);
  }, [revalidate, state]);
  const groups = loaderData.code.match(/.{1,3}/g) ?? [];
  return (
    <main className="wall grid min-h-dvh content-center justify-items-center gap-10 bg-concrete-100 p-8 text-center text-ink">
      <Bob />
      <h1 className="font-label text-5xl font-semibold">Pair this display</h1>
      <p className="flex gap-8 font-label text-7xl font-bold tracking-widest">
        <span className="sr-only">Pairing code: </span>
        {groups.map((group) => (
          <span key={group}>{group}</span>
        ))}
      </p>
      <p className="max-w-2xl text-2xl text-concrete-700">
        A foreman opens <b>Setup, Displays</b> on their own screen and types this code. It is good for ten
        minutes.
      </p>
    </main>
  );
}
