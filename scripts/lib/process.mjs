import { execFileSync, spawn } from "node:child_process";
import { accessSync, constants, readFileSync } from "node:fs";
import { delimiter, join } from "node:path";
import { setTimeout as wait } from "node:timers/promises";
import { root } from "./project.mjs";

const keptOutput = 400_000;

/**
 * Runs a command to its end. It gets a process group of its own, so that Ctrl-C reaches it through us only,
 * and the whole group is ended when `interrupt` fires.
 * @param {string} command
 * @param {string[]} args
 * @param {object} [options]
 * @param {NodeJS.ProcessEnv} [options.env]
 * @param {string} [options.input] text for its standard input
 * @param {boolean} [options.show] let it write to our terminal instead of keeping its output
 * @param {boolean} [options.endGroup] end whatever it left running, so that nothing prints afterwards
 * @param {AbortSignal} [options.interrupt]
 * @returns {Promise<{ code: number, stdout: string, output: string }>} output holds both streams
 */
export function run(command, args, options = {}) {
  const { env = process.env, input, show = false, endGroup = false, interrupt } = options;
  interrupt?.throwIfAborted();
  return new Promise((resolve, reject) => {
    const shown = show ? "inherit" : "pipe";
    const stdio = [input === undefined ? "ignore" : "pipe", shown, shown];
    const child = spawn(command, args, { cwd: root, env, stdio, detached: true });
    let stdout = "";
    let output = "";
    let killTimer;
    child.stdout?.setEncoding("utf8").on("data", (text) => {
      stdout = (stdout + text).slice(-keptOutput);
      output = (output + text).slice(-keptOutput);
    });
    child.stderr?.setEncoding("utf8").on("data", (text) => {
      output = (output + text).slice(-keptOutput);
    });
    child.stdin?.on("error", () => {}).end(input);

    const stop = () => {
      signalGroup(child.pid, "SIGTERM");
      killTimer = setTimeout(() => signalGroup(child.pid, "SIGKILL"), 10_000);
    };
    interrupt?.addEventListener("abort", stop, { once: true });

    const settle = (code) => {
      interrupt?.removeEventListener("abort", stop);
      clearTimeout(killTimer);
      if (endGroup || interrupt?.aborted) signalGroup(child.pid, "SIGKILL");
      child.stdout?.destroy();
      child.stderr?.destroy();
      if (interrupt?.aborted) reject(interrupt.reason);
      else resolve({ code, stdout, output });
    };
    child.once("error", (error) => {
      output += error.message;
      settle(127);
    });
    // A service it started may hold the pipes open for ever: after the exit, wait for them only briefly.
    child.once("exit", (code) => {
      const drained = setTimeout(() => settle(code ?? 1), 2_000);
      child.once("close", () => {
        clearTimeout(drained);
        settle(code ?? 1);
      });
    });
  });
}

/** Signals a process and everything in its group; quiet when it is gone or not ours. */
export function signalGroup(pid, signal) {
  if (!pid) return;
  try {
    process.kill(-pid, signal);
  } catch (error) {
    if (error.code !== "ESRCH" && error.code !== "EPERM") throw error;
  }
}

/** Whether a process runs. One that has ended but was not yet collected by its parent (a zombie) does not. */
export function isRunning(pid) {
  try {
    process.kill(pid, 0);
  } catch (error) {
    return error.code === "EPERM";
  }
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, "utf8");
    const state = stat.slice(stat.lastIndexOf(")") + 2)[0];
    return state !== "Z" && state !== "X";
  } catch {
    // Gone meanwhile, or a system without /proc.
    return process.platform !== "linux";
  }
}

/** The command line of a running process; empty when the system does not tell. */
export function commandLine(pid) {
  try {
    if (process.platform === "linux")
      return readFileSync(`/proc/${pid}/cmdline`, "utf8").replaceAll("\0", " ");
    return execFileSync("ps", ["-ww", "-o", "command=", "-p", String(pid)], { encoding: "utf8" });
  } catch {
    return "";
  }
}

/** Waits until a process has ended; false when it still runs after the given time. */
export async function hasEnded(pid, milliseconds) {
  const deadline = performance.now() + milliseconds;
  while (isRunning(pid)) {
    if (performance.now() > deadline) return false;
    await wait(50);
  }
  return true;
}

/** The full path of the first of these programs that is installed, looking in the system folders too. */
export function findProgram(names, path = process.env.PATH ?? "") {
  const folders = [...path.split(delimiter), "/usr/local/sbin", "/usr/sbin", "/usr/local/bin", "/usr/bin"];
  for (const name of names) {
    for (const folder of folders.filter(Boolean)) {
      const file = join(folder, name);
      try {
        accessSync(file, constants.X_OK);
        return file;
      } catch {
        // Not in this folder.
      }
    }
  }
  return undefined;
}
