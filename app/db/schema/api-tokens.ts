import { char, index, mysqlTable, unique, varchar } from "drizzle-orm/mysql-core";
import { id, moment, ref } from "./columns";
import { people } from "./people";
import { shops } from "./shop";

/** Keys that programs of the shop's own use to ask for calculations. Here lies only the SHA-256 of each. */
export const apiTokens = mysqlTable(
  "api_tokens",
  {
    id: id(),
    shopId: ref()
      .notNull()
      .references(() => shops.id),
    name: varchar({ length: 60 }).notNull(),
    tokenHash: char({ length: 64 }).notNull(),
    madeBy: ref()
      .notNull()
      .references(() => people.id),
    madeAt: moment().notNull(),
    /** NULL: never used. Written at most once a minute. */
    lastUsedAt: moment(),
    /** NULL: still good. */
    revokedAt: moment(),
  },
  (t) => [
    // Who sends this token?
    unique("api_tokens_hash").on(t.tokenHash),
    // The list in Setup.
    index("api_tokens_shop").on(t.shopId),
  ],
);
