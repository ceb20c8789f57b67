import { randomBytes } from "node:crypto";
import { mkdirSync, readFileSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { Problem } from "./output.mjs";

/**
 * The passwords and the session key of one installation: made up at its first start, kept in its own data
 * folder for its owner's eyes only, and nowhere else.
 * @param {string} home the data folder
 * @returns {{ databaseRoot: string, databaseApp: string, session: string }}
 */
export function readSecrets(home) {
  try {
    return readOrMake(home);
  } catch (error) {
    if (error.code !== "EACCES" && error.code !== "EPERM" && error.code !== "EROFS") throw error;
    throw new Problem(`${home} cannot be written: ${error.message}.`, {
      todo: "run the command as the user to whom this folder belongs, or give yourself the right to write in it.",
    });
  }
}

function readOrMake(home) {
  const file = join(home, "secrets.json");
  mkdirSync(home, { recursive: true, mode: 0o700 });
  const made = { databaseRoot: random(), databaseApp: random(), session: random() };
  try {
    writeFileSync(file, `${JSON.stringify(made, null, 2)}\n`, { mode: 0o600, flag: "wx" });
    return made;
  } catch (error) {
    if (error.code !== "EEXIST") throw error;
  }
  const kept = parse(readFileSync(file, "utf8"));
  if (Object.keys(made).every((name) => typeof kept[name] === "string" && kept[name] !== "")) return kept;
  throw new Problem(`${file} is damaged.`, {
    todo: "delete that file and run the command again: new passwords are made, everybody signs in anew.",
  });
}

function random() {
  return randomBytes(32).toString("base64url");
}

function parse(text) {
  try {
    return JSON.parse(text) ?? {};
  } catch {
    return {};
  }
}
