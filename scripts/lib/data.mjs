import { lastLines, Problem, say } from "./output.mjs";
import { run } from "./process.mjs";
import { inProject, packageCommand } from "./project.mjs";

const exitHalfApplied = 3;

/**
 * The project's own programs for its database: as built, or in development straight from their sources.
 * @param {object} options
 * @param {string} options.databaseUrl
 * @param {NodeJS.ProcessEnv} options.env
 * @param {boolean} [options.fromSources]
 * @param {AbortSignal} [options.interrupt]
 */
export function dataPrograms({ databaseUrl, env, fromSources = false, interrupt }) {
  const programEnv = { ...env, DATABASE_URL: databaseUrl, MIGRATIONS_DIR: inProject("drizzle") };
  const start = (name, ...args) => {
    const [command, file] = fromSources
      ? [packageCommand("tsx"), inProject("server", `${name}.ts`)]
      : [process.execPath, inProject("build", "server", `${name}.js`)];
    return run(command, [file, ...args], { env: programEnv, interrupt });
  };

  return {
    /** Brings the tables up to date. */
    async migrate() {
      const { code, output } = await start("migrate");
      if (code === 0) return say("Tables", "up to date");
      const details = lastLines(output);
      if (code === exitHalfApplied) {
        throw new Problem("A change of the tables was applied only in part, and was not tried again.", {
          details,
          todo:
            "with data you need: restore the last backup, or finish that change by hand. With demo data: " +
            "`node scripts/reset.mjs` (this deletes the data), then run the command again.",
        });
      }
      throw new Problem("The tables could not be brought up to date.", {
        details,
        todo: "check that the database named above answers and lets this account change tables.",
      });
    },

    /** Fills an empty database with the demo shop; leaves any other as it is. */
    async seedIfEmpty() {
      const { code, output } = await start("seed", "--if-empty");
      if (code === 0) return;
      throw new Problem("The demo data could not be written.", { details: lastLines(output) });
    },

    /**
     * Who can sign in to the demo shop. Empty on a database that is not a demo.
     * @returns {Promise<{ shop?: string, signIns: { role: string, name: string, email: string, password: string }[] }>}
     */
    async readSignIns() {
      const { code, stdout } = await start("seed", "--sign-ins");
      try {
        if (code === 0) return { signIns: [], ...JSON.parse(stdout) };
      } catch {
        // Not worth failing a start for: people then sign in as they know.
      }
      return { signIns: [] };
    },
  };
}
