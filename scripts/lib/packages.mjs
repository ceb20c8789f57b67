import { createHash } from "node:crypto";
import { readFileSync, writeFileSync } from "node:fs";
import { lastLines, Problem, say, secondsSince } from "./output.mjs";
import { run } from "./process.mjs";
import { inProject } from "./project.mjs";

/**
 * Installs the packages of package-lock.json, unless exactly those are installed already. The stamp lies
 * inside node_modules, so it vanishes with it.
 */
export async function ensurePackages(interrupt) {
  const stamp = inProject("node_modules", ".plumbay-lock");
  const wanted = createHash("sha256")
    .update(readFileSync(inProject("package-lock.json")))
    .digest("hex");
  if (readIfThere(stamp) === wanted) return say("Packages", "up to date");

  say("Packages", "installing (about a minute)");
  const began = performance.now();
  // The build needs the development packages, whatever NODE_ENV or the npm settings say.
  const { code, output } = await run("npm", ["ci", "--include=dev", "--no-audit", "--no-fund"], {
    interrupt,
  });
  if (code !== 0) {
    throw new Problem("The packages could not be installed.", {
      details: lastLines(output),
      todo: "check that this computer reaches the npm registry (network, proxy), then run the command again.",
    });
  }
  writeFileSync(stamp, wanted);
  say("Packages", `installed (${secondsSince(began)})`);
}

function readIfThere(file) {
  try {
    return readFileSync(file, "utf8");
  } catch {
    return undefined;
  }
}
