import { spawn } from "node:child_process";
import { setTimeout as wait } from "node:timers/promises";
import { Problem, say } from "./output.mjs";
import { hasEnded, isRunning, signalGroup } from "./process.mjs";
import { inProject, root } from "./project.mjs";

const patience = { start: 120_000, stop: 17_000 }; // The app gives requests under way 15 seconds.

/**
 * Starts the app's server process, in a group of its own so that only we decide when it ends.
 * @param {{ url: string, env: NodeJS.ProcessEnv, interrupt: AbortSignal }} options
 */
export function launchApp({ url, env, interrupt }) {
  const child = spawn(process.execPath, [inProject("server", "launch.js")], {
    cwd: root,
    env,
    stdio: ["ignore", "inherit", "inherit"],
    detached: true,
  });
  /** @type {Promise<number>} */
  const ended = new Promise((resolve) => {
    child.once("error", () => resolve(1));
    child.once("exit", (code) => resolve(code ?? 1));
  });
  let stopping;

  return {
    /** Its exit code, once it has ended. */
    ended,

    /** Waits until it answers; false when it ended before that. */
    async untilReady() {
      const deadline = performance.now() + patience.start;
      while (isRunning(child.pid)) {
        interrupt.throwIfAborted();
        if (await answers(`${url}/healthz`)) return true;
        if (performance.now() > deadline) {
          throw new Problem(`The app started, but ${url}/healthz does not answer with 200.`, {
            todo: "read what the app printed above.",
          });
        }
        await wait(100);
      }
      return false;
    },

    /** Asks it to end, once, and waits until it has. */
    stop() {
      stopping ??= stop(child);
      return stopping;
    },
  };
}

async function stop(child) {
  if (!child.pid) return;
  if (isRunning(child.pid)) {
    child.kill("SIGTERM");
    if (!(await hasEnded(child.pid, patience.stop))) say("App", "did not end in time, so it was cut off");
  }
  signalGroup(child.pid, "SIGKILL");
}

async function answers(url) {
  try {
    const response = await fetch(url, { signal: AbortSignal.timeout(5_000), redirect: "manual" });
    await response.body?.cancel();
    return response.status === 200;
  } catch {
    return false;
  }
}
