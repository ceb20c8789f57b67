import { readdirSync } from "node:fs";
import type { Topic } from "./check";

/** Every file here named <topic>.checks.ts, by name. */
const files = readdirSync(import.meta.dirname)
  .filter((name) => name.endsWith(".checks.ts"))
  .sort();

export const topics: Topic[] = await Promise.all(
  files.map(async (file) => {
    const module = (await import(`./${file}`)) as { default: Topic };
    return module.default;
  }),
);
