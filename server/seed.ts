import { randomInt } from "node:crypto";
import { existsSync, mkdirSync, readFileSync, writeFileSync } from "node:fs";
import { dirname } from "node:path";
import { openDatabase } from "../app/db/client.server";
import { makeDemoShop } from "./seed/demo-shop";
import { hasShop } from "./seed/factories";

/*
 * --if-empty   fills a database that holds no shop with the demo shop
 * --sign-ins   prints who can sign in to the demo shop, as JSON; nobody when there is no demo shop
 * The demo's password is made when the demo is, and kept beside the data, outside the repository.
 */

type SignIns = { shop: string; signIns: { role: string; name: string; email: string; password: string }[] };

const file = process.env.DEMO_SIGN_INS_FILE ?? ".data/demo-sign-ins.json";
const url = process.env.DATABASE_URL;

if (process.argv.includes("--sign-ins")) {
  const known: SignIns = existsSync(file)
    ? JSON.parse(readFileSync(file, "utf8"))
    : { shop: "", signIns: [] };
  console.log(JSON.stringify(known));
} else if (!url) {
  console.error("DATABASE_URL is missing.");
  process.exitCode = 1;
} else {
  const { db, pool } = openDatabase(url, 2);
  try {
    if (await hasShop(db)) console.log("Demo shop: not needed, the database holds a shop");
    else {
      const password = `plumb-line-${randomInt(1000, 10_000)}`;
      const { shop, signIns } = await makeDemoShop(db, password);
      const known: SignIns = { shop, signIns: signIns.map((signIn) => ({ ...signIn, password })) };
      mkdirSync(dirname(file), { recursive: true });
      writeFileSync(file, JSON.stringify(known, null, 2), { mode: 0o600 });
      console.log("Demo shop: made");
    }
  } finally {
    await pool.end();
  }
}
