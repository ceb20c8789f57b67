/**
 * `node scripts/reset.mjs [--yes]`: deletes the private database with everything in it, so that the next
 * start begins with fresh demo data.
 */
import { existsSync, rmSync } from "node:fs";
import { createInterface } from "node:readline";
import { stopDatabase } from "./lib/database.mjs";
import { requireNode } from "./lib/node-version.mjs";
import { Problem, say, tellProblem } from "./lib/output.mjs";
import { inProject } from "./lib/project.mjs";

try {
  requireNode();
  await reset();
} catch (error) {
  tellProblem(error);
  process.exitCode = 1;
}

async function reset() {
  const home = inProject(".data");
  const folder = inProject(".data", "mariadb");
  if (!existsSync(folder)) return say("Data", "there is none to delete");
  if (!process.argv.includes("--yes") && !(await agrees(folder))) return say("Data", "kept");
  if (await stopDatabase(home)) say("Database", "stopped");
  rmSync(folder, { recursive: true, force: true });
  say("Data", "deleted; the next `npm start` begins anew");
}

function agrees(folder) {
  if (!process.stdin.isTTY) {
    throw new Problem("Deleting all data needs a yes, and nobody can be asked here.", {
      todo: "run `node scripts/reset.mjs --yes`",
    });
  }
  const terminal = createInterface({ input: process.stdin, output: process.stdout });
  return new Promise((resolve) => {
    terminal.once("close", () => resolve(false));
    terminal.question(`This deletes all Plumbay data in ${folder}. Type yes to go on: `, (answer) => {
      resolve(answer.trim().toLowerCase() === "yes");
      terminal.close();
    });
  });
}
