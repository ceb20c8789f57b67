import { createCookie } from "react-router";
import { env } from "../env.server";

const make = (name: string, maxAge: number) =>
  createCookie(env().COOKIE_SECURE === "1" ? `__Host-${name}` : name, {
    httpOnly: true,
    sameSite: "lax",
    path: "/",
    secure: env().COOKIE_SECURE === "1",
    secrets: [env().SESSION_SECRET],
    maxAge,
  });

type Cookie = ReturnType<typeof make>;
let session: Cookie | undefined;
let pairing: Cookie | undefined;

/** The session cookie: a random secret, signed. What it stands for is in the database. */
export const sessionCookie = () => (session ??= make("plumbay_session", 60 * 60 * 24 * 400));
/** The claim of a display that waits to be paired. */
export const pairingCookie = () => (pairing ??= make("plumbay_pairing", 60 * 15));

/** The secret in a Cookie header, or null. */
export async function sessionSecret(cookieHeader: string | null | undefined): Promise<string | null> {
  const value: unknown = await sessionCookie().parse(cookieHeader ?? null);
  return typeof value === "string" ? value : null;
}
