import { dirname, join } from "node:path";
import { fileURLToPath } from "node:url";

/** The folder of the project, whichever folder the command was typed in. */
export const root = dirname(dirname(dirname(fileURLToPath(import.meta.url))));

/** A path inside the project. */
export function inProject(...parts) {
  return join(root, ...parts);
}

/** The path of a command that one of the packages brought. */
export function packageCommand(name) {
  return inProject("node_modules", ".bin", name);
}
