/**
 * A calculation on the command line: `npm run calc -- leaf < input.json`. The same schemas as the API; no database.
 * Without a name it lists them. Ends with 0, 2 (figures cannot be read), 3 (nothing can come of them), 64 (no such name).
 */
import { text } from "node:stream/consumers";
import { CALCS, findCalc } from "../app/calc/registry";
import { runCalc } from "../app/calc/run-calc";

const EXIT = { 200: 0, 400: 2, 422: 3 } as const;
const [name] = process.argv.slice(2);
const calc = name === undefined ? undefined : findCalc(name);

if (!calc) {
  if (name !== undefined) console.error(`There is no calculation called ${name}. There are:`);
  for (const one of CALCS) console.log(`${one.name.padEnd(14)} ${one.title}`);
  process.exitCode = name === undefined ? 0 : 64;
} else {
  let body: unknown;
  try {
    body = JSON.parse(await text(process.stdin));
  } catch (error) {
    console.error(`The input is not JSON: ${error instanceof Error ? error.message : String(error)}`);
    process.exit(2);
  }
  const answer = runCalc(calc, body);
  (answer.status === 200 ? console.log : console.error)(JSON.stringify(answer.body, null, 2));
  process.exitCode = EXIT[answer.status];
}
