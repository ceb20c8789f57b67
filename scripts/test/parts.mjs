import { mkdirSync, rmSync } from "node:fs";
import { findOrInstall } from "../lib/apt.mjs";
import { ensureBuild } from "../lib/build.mjs";
import { dataPrograms } from "../lib/data.mjs";
import { say, tellProblem } from "../lib/output.mjs";
import { anyFreePort } from "../lib/ports.mjs";
import { findProgram, run } from "../lib/process.mjs";
import { inProject, packageCommand } from "../lib/project.mjs";
import { readReport } from "./reports.mjs";

/** What `npm test -- <part>` may name, in the order in which all of them run. */
export const PARTS = ["types", "lint", "imports", "unit", "integration", "e2e"];

const NOTHING = { passed: 0, failed: 0 };
const ONE_FAILED = { passed: 0, failed: 1 };

/**
 * The parts, each answering how many of its checks passed and failed.
 * @param {object} world
 * @param {() => Promise<{ url: (name: string) => string, recreate: (name: string) => Promise<void> }>} world.database opens the test server, once
 * @param {string} world.sessionSecret
 * @param {string[]} world.more arguments for the runner itself
 * @param {AbortSignal} world.interrupt
 */
export function makeParts({ database, sessionSecret, more, interrupt }) {
  const show = { show: true, endGroup: true, interrupt };
  const check = async (command, args) => {
    const { code } = await run(packageCommand(command), args, show);
    return code === 0 ? { passed: 1, failed: 0 } : ONE_FAILED;
  };
  const vitest = async (project, env) => {
    const file = report(project);
    const args = [
      "run",
      "--project",
      project,
      "--reporter=default",
      "--reporter=json",
      `--outputFile=${file}`,
    ];
    const { code } = await run(packageCommand("vitest"), [...args, ...more], { ...show, env });
    return judge(readReport("vitest", file), code);
  };

  return {
    async types() {
      const { code } = await run(packageCommand("react-router"), ["typegen"], show);
      return code === 0 ? check("tsc", ["--noEmit"]) : ONE_FAILED;
    },
    lint: () => check("biome", ["check", "."]),
    imports: () => check("depcruise", ["--config", ".dependency-cruiser.cjs", "app", "server"]),
    unit: () => vitest("unit", process.env),
    async integration() {
      // Some of these tests run the server as it is built.
      await ensureBuild(interrupt);
      const { url } = await database();
      return vitest("integration", { ...process.env, TEST_DATABASE_URL: url("plumbay_test") });
    },
    async e2e() {
      await ensureBuild(interrupt);
      const chromium = await findChromium(interrupt);
      const { url, recreate } = await database();
      await recreate("plumbay_e2e");
      const databaseUrl = url("plumbay_e2e");
      const env = { ...process.env, SESSION_SECRET: sessionSecret, NODE_ENV: "production" };
      await dataPrograms({ databaseUrl, env, interrupt }).migrate();
      const file = report("e2e");
      const { code } = await run(packageCommand("playwright"), ["test", "--reporter=list,json", ...more], {
        ...show,
        env: {
          ...process.env,
          SESSION_SECRET: sessionSecret,
          CHROMIUM_PATH: chromium,
          E2E_DATABASE_URL: databaseUrl,
          E2E_PORT: String(await anyFreePort()),
          PLAYWRIGHT_JSON_OUTPUT_NAME: file,
        },
      });
      return judge(readReport("playwright", file), code);
    },
  };
}

/** A fresh place for a runner's report: an old one must not pass for a new one. */
function report(name) {
  mkdirSync(inProject(".test"), { recursive: true });
  const file = inProject(".test", `${name}.json`);
  rmSync(file, { force: true });
  return file;
}

/** A runner that failed counts as a failure even when its report names none, or is missing. */
function judge(counts, code) {
  if (counts === null) return code === 0 ? NOTHING : ONE_FAILED;
  return code !== 0 && counts.failed === 0 ? { ...counts, failed: 1 } : counts;
}

const findChromium = (interrupt) =>
  findOrInstall(
    {
      title: "Chromium",
      find: () => findProgram(["chromium"]),
      debianPackage: "chromium",
      elsewhere: "install Chromium so that `chromium` can be found, then run the command again.",
    },
    interrupt,
  );

/** Runs one part under its heading; what stops it altogether counts as one failure. */
export async function runPart(name, part) {
  say("\nTests", name);
  try {
    return await part();
  } catch (error) {
    if (error.name === "Interrupted") throw error;
    tellProblem(error);
    return ONE_FAILED;
  }
}
