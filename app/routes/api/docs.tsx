import { fieldLines } from "~/calc/fields";
import { CALCS } from "~/calc/registry";
import { CalcPage } from "~/components/api/calc-page";
import type { Route } from "./+types/docs";

export const meta: Route.MetaFunction = () => [{ title: "Calculations · Plumbay" }];

/** GET /api/docs: the calculations described for people. Open to anyone, as the description for programs is. */
export function loader() {
  return {
    calcs: CALCS.map((calc) => ({
      name: calc.name,
      title: calc.title,
      summary: calc.summary,
      cautions: calc.cautions ?? [],
      takes: fieldLines(calc.input, "input"),
      answers: fieldLines(calc.output, "output"),
      examples: calc.examples.map(({ title, input, output }) => ({
        title,
        input: JSON.stringify(input, null, 2),
        output: JSON.stringify({ calc: calc.name, result: output, cautions: calc.cautions ?? [] }, null, 2),
      })),
    })),
  };
}

export default function Docs({ loaderData }: Route.ComponentProps) {
  return <CalcPage calcs={loaderData.calcs} />;
}
