import { and, desc, eq, isNull } from "drizzle-orm";
import { hashOf, newSecret } from "../auth/sessions.server";
import { type Db, schema } from "../db/client.server";
import { type Context, change, requirePerson } from "./change.server";
import { Refusal } from "./errors";

const { apiTokens, people } = schema;

/** So that a token found lying about is known for what it is. */
const PREFIX = "plumbay_";

export type TokenRow = { id: number; name: string; madeBy: string; madeAt: Date; lastUsedAt: Date | null };

/** The shop's tokens that are good, newest first. The tokens themselves are known to nobody any more. */
export async function listTokens(db: Db, shopId: number): Promise<TokenRow[]> {
  return db
    .select({
      id: apiTokens.id,
      name: apiTokens.name,
      madeBy: people.name,
      madeAt: apiTokens.madeAt,
      lastUsedAt: apiTokens.lastUsedAt,
    })
    .from(apiTokens)
    .innerJoin(people, eq(people.id, apiTokens.madeBy))
    .where(and(eq(apiTokens.shopId, shopId), isNull(apiTokens.revokedAt)))
    .orderBy(desc(apiTokens.id));
}

/** Makes a token for a program of the shop's own. @returns the token, this once; only its hash is kept */
export async function makeToken(ctx: Context, name: string): Promise<{ token: string; words: string }> {
  const actor = requirePerson(ctx, "tokens:make");
  const token = PREFIX + newSecret();
  return change(ctx, async (tx, note) => {
    const [row] = await tx
      .insert(apiTokens)
      .values({
        shopId: actor.shopId,
        name,
        tokenHash: hashOf(token),
        madeBy: actor.personId,
        madeAt: ctx.now(),
      })
      .$returningId();
    if (!row) throw new Error("The token was not inserted");
    const words = `Token ${name} made`;
    note({
      verb: "make-token",
      subject: { kind: "token", id: row.id },
      words,
      after: { name },
      touches: [{ kind: "setup" }],
    });
    return { token, words };
  });
}

/** Takes a token back. @throws Refusal not-found */
export async function revokeToken(ctx: Context, tokenId: number): Promise<{ words: string }> {
  const actor = requirePerson(ctx, "tokens:make");
  return change(ctx, async (tx, note) => {
    const [row] = await tx
      .select()
      .from(apiTokens)
      .where(and(eq(apiTokens.id, tokenId), eq(apiTokens.shopId, actor.shopId), isNull(apiTokens.revokedAt)))
      .for("update");
    if (!row) throw new Refusal("not-found", "There is no such token any more.");
    await tx.update(apiTokens).set({ revokedAt: ctx.now() }).where(eq(apiTokens.id, row.id));
    const words = `Token ${row.name} revoked`;
    note({
      verb: "revoke-token",
      subject: { kind: "token", id: row.id },
      words,
      before: { name: row.name },
      touches: [{ kind: "setup" }],
    });
    return { words };
  });
}
