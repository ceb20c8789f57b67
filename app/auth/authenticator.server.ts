import bcrypt from "bcryptjs";
import { and, eq, gt, isNull, lt, sql } from "drizzle-orm";
import { Authenticator } from "remix-auth";
import { FormStrategy } from "remix-auth-form";
import { type Db, schema } from "../db/client.server";
import { hashOf } from "./sessions.server";

const WINDOW_MS = 15 * 60_000;
const TRIES_PER_ACCOUNT = 10;
/** Compared against when there is no such account, so that the answer takes as long. Made by bcrypt at cost 10 from random bytes. */
const NOBODY = "$2b$10$J8v3m7q2yC1kY4dQe6bB1uO5xA7pL9nW2sR4tV6zX8cE0fG2hI3kK";

export class SignInRefused extends Error {}
/** Too many failures on one account lately. */
export class SignInSlowedDown extends SignInRefused {}

export type SignedIn = { personId: number; shopId: number };

export const hashPassword = (password: string) => bcrypt.hash(password, 10);

/**
 * The sign-in by form: fields `email` and `password`. One answer for an unknown account, a wrong password and a person
 * who has left; failures are counted per account, known or not.
 */
export function makeAuthenticator(db: Db, now: () => Date): Authenticator<SignedIn> {
  const { people, signInFailures } = schema;
  const authenticator = new Authenticator<SignedIn>();
  authenticator.use(
    new FormStrategy<SignedIn>(async ({ form }) => {
      const email = String(form.get("email") ?? "")
        .trim()
        .toLowerCase();
      const password = String(form.get("password") ?? "");
      const accountHash = hashOf(`account:${email}`);
      const since = new Date(now().getTime() - WINDOW_MS);
      const [tries] = await db
        .select({ n: sql<number>`count(*)` })
        .from(signInFailures)
        .where(and(eq(signInFailures.accountHash, accountHash), gt(signInFailures.at, since)));
      if (Number(tries?.n ?? 0) >= TRIES_PER_ACCOUNT)
        throw new SignInSlowedDown("Too many tries on this account. Wait 15 minutes, or ask the owner.");
      const [found] = await db
        .select()
        .from(people)
        .where(and(eq(people.email, email), isNull(people.leftAt)));
      // The database takes é for e; failures are counted by what was typed, so only that very address signs in.
      const person = found?.email === email ? found : undefined;
      const good = await bcrypt.compare(password, person?.passwordHash ?? NOBODY);
      if (!person?.passwordHash || !good) {
        await db.insert(signInFailures).values({ accountHash, at: now() });
        throw new SignInRefused("That address and password do not belong together.");
      }
      await db.delete(signInFailures).where(lt(signInFailures.at, since));
      return { personId: person.id, shopId: person.shopId };
    }),
    "form",
  );
  return authenticator;
}
