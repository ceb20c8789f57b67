import { Problem } from "./output.mjs";

const oldest = [20, 19];

/** Throws in plain words when this Node is too old to run Plumbay. */
export function requireNode(version = process.versions.node) {
  const [major, minor] = version.split(".").map(Number);
  if (major > oldest[0] || (major === oldest[0] && minor >= oldest[1])) return;
  throw new Problem(`Plumbay needs Node ${oldest.join(".")} or newer, and this is Node ${version}.`, {
    todo: "install a newer Node (https://nodejs.org, or `nvm install 22`) and run the command again.",
  });
}
