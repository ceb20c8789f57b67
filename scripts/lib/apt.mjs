import { lastLines, Problem, say } from "./output.mjs";
import { findProgram, run } from "./process.mjs";

/**
 * Finds a program, and installs its Debian package first when it is missing.
 * @param {object} wanted
 * @param {string} wanted.title what people call it
 * @param {() => string | undefined} wanted.find gives the program's path once it is there
 * @param {string} wanted.debianPackage
 * @param {string} wanted.elsewhere what to do on a system without apt
 * @param {AbortSignal} [interrupt]
 */
export async function findOrInstall({ title, find, debianPackage, elsewhere }, interrupt) {
  const present = find();
  if (present) return present;

  const aptGet = findProgram(["apt-get"]);
  if (!aptGet) throw new Problem(`${title} is not installed.`, { todo: elsewhere });
  const prefix = await rightToInstall(interrupt);
  if (!prefix) {
    throw new Problem(`${title} is not installed, and this account may not install packages.`, {
      todo: `run \`sudo apt-get install --no-install-recommends ${debianPackage}\`, then this command again.`,
    });
  }

  say(title, `installing Debian's ${debianPackage} (a minute or two)`);
  const apt = (...args) => {
    const [command, ...rest] = [...prefix, "env", "DEBIAN_FRONTEND=noninteractive", aptGet, ...args];
    return run(command, rest, { interrupt });
  };
  const patience = ["-o", "DPkg::Lock::Timeout=120", "-o", "Acquire::Retries=3"];
  const update = await apt("update", ...patience);
  const install = await apt("install", "-y", "--no-install-recommends", ...patience, debianPackage);

  // What counts is the program: the package may complain that it could not start a service we do not use.
  const installed = find();
  if (installed) return installed;
  const details = lastLines(update.code === 0 ? install.output : `${update.output}\n${install.output}`);
  throw new Problem(`${title} could not be installed.`, {
    details,
    todo:
      "check that this computer reaches its Debian package server (network, proxy, /etc/apt), then run the " +
      `command again. By hand: \`sudo apt-get update && sudo apt-get install ${debianPackage}\``,
  });
}

/** What to put before a command so that it may install packages; undefined without that right. */
async function rightToInstall(interrupt) {
  if (process.getuid?.() === 0) return [];
  const sudo = findProgram(["sudo"]);
  if (!sudo) return undefined;
  const { code } = await run(sudo, ["-n", "true"], { interrupt });
  return code === 0 ? [sudo, "-n"] : undefined;
}
