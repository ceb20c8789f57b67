import { createHash } from "node:crypto";
import { existsSync, readdirSync, readFileSync, rmSync, statSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { lastLines, Problem, say, secondsSince } from "./output.mjs";
import { run } from "./process.mjs";
import { inProject, packageCommand } from "./project.mjs";

const sources = [
  "app",
  "server",
  "public",
  "vite.config.ts",
  "react-router.config.ts",
  "tsconfig.json",
  "package-lock.json",
];

/** Makes the production build, unless the present one was made from exactly these sources. */
export async function ensureBuild(interrupt) {
  const stamp = inProject("build", ".sources");
  const wanted = hashSources();
  const complete =
    existsSync(inProject("build", "server", "index.js")) && existsSync(inProject("build", "client"));
  if (complete && existsSync(stamp) && readFileSync(stamp, "utf8") === wanted)
    return say("Build", "up to date");

  say("Build", "making the production build (some seconds)");
  const began = performance.now();
  rmSync(stamp, { force: true });
  const env = { ...process.env, NODE_ENV: "production" };
  const { code, output } = await run(packageCommand("react-router"), ["build"], { env, interrupt });
  if (code !== 0) {
    throw new Problem("The build failed.", {
      details: lastLines(output, 60),
      todo: "mend what the build names above, then run the command again.",
    });
  }
  writeFileSync(stamp, wanted);
  say("Build", `ready (${secondsSince(began)})`);
}

/** One hash over the names and contents of everything the build is made from. */
function hashSources() {
  const hash = createHash("sha256");
  for (const source of sources) {
    for (const file of filesUnder(source)) {
      const content = readFileSync(inProject(file));
      hash.update(`${file}\0${content.length}\0`).update(content);
    }
  }
  return hash.digest("hex");
}

/** The files at or below a path of the project, always in the same order. */
function filesUnder(path) {
  const found = statSync(inProject(path), { throwIfNoEntry: false });
  if (!found) return [];
  if (!found.isDirectory()) return [path];
  return readdirSync(inProject(path))
    .sort()
    .flatMap((name) => filesUnder(join(path, name)));
}
