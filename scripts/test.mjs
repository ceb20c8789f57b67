/**
 * `npm test`: everything that must hold, from a fresh checkout: types, lint and format, import rules, unit tests,
 * integration tests on a real MariaDB, end-to-end tests in a real Chromium. `npm test -- <part> [more]` runs one part and
 * hands the rest to its runner. The last line says `N passed, N failed`.
 */
import { openDatabase } from "./lib/database.mjs";
import { Interrupted, watchInterrupts } from "./lib/interrupt.mjs";
import { requireNode } from "./lib/node-version.mjs";
import { outliveClosedTerminal, tellProblem } from "./lib/output.mjs";
import { ensurePackages } from "./lib/packages.mjs";
import { inProject } from "./lib/project.mjs";
import { readSecrets } from "./lib/secrets.mjs";
import { makeParts, PARTS, runPart } from "./test/parts.mjs";

const FIRST_PORT = 33_406;

outliveClosedTerminal();
const interrupt = watchInterrupts();
const total = { passed: 0, failed: 0 };
let opened;

try {
  requireNode();
  const { names, more } = readArguments(process.argv.slice(2));
  await ensurePackages(interrupt);
  const home = inProject(".test");
  const secrets = readSecrets(home);
  const database = async () => {
    opened ??= await openDatabase({
      home,
      port: FIRST_PORT,
      secrets,
      databases: ["plumbay_test"],
      forgetful: true,
      interrupt,
    });
    return opened;
  };
  const parts = makeParts({ database, sessionSecret: secrets.session, more, interrupt });
  for (const name of names) {
    const { passed, failed } = await runPart(name, parts[name]);
    total.passed += passed;
    total.failed += failed;
  }
} catch (error) {
  total.failed += 1;
  if (!(error instanceof Interrupted)) tellProblem(error);
} finally {
  await opened?.close();
}

process.exitCode = total.failed > 0 || total.passed === 0 ? 1 : 0;
console.log(`\n${total.passed} passed, ${total.failed} failed`);

/** Which parts to run, and what to hand to the runner of the one that was named. */
function readArguments([name, ...more]) {
  if (name === undefined) return { names: PARTS, more: [] };
  if (PARTS.includes(name)) return { names: [name], more: more.filter((word) => word !== "--") };
  throw new Error(`There is no part called ${name}. Parts: ${PARTS.join(", ")}.`);
}
