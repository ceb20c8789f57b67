import type { Calc } from "./calc";

/** What a calculation answers to somebody outside: an HTTP status and a body, also used by the command line. */
export type CalcAnswer =
  | { status: 200; body: { calc: string; result: unknown; cautions: readonly string[] } }
  | { status: 400; body: { message: string; fields: { path: string; message: string }[] } }
  | { status: 422; body: { message: string } };

/**
 * Runs one calculation on a body that anybody may have sent.
 * @returns 200 with the result; 400 with the path of every field that cannot be read; 422 with a sentence when the
 * figures are well formed but nothing can come of them
 */
export function runCalc(calc: Calc, body: unknown): CalcAnswer {
  const read = calc.input.safeParse(body);
  if (!read.success)
    return {
      status: 400,
      body: {
        message: "These figures cannot be read.",
        fields: read.error.issues.map((issue) => ({
          path: issue.path.map(String).join("."),
          message: issue.message,
        })),
      },
    };
  const came = calc.run(read.data);
  if (!came.ok) return { status: 422, body: { message: came.problem } };
  return {
    status: 200,
    body: { calc: calc.name, result: calc.output.parse(came.value), cautions: calc.cautions ?? [] },
  };
}
