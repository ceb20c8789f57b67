import { findCalc } from "~/calc/registry";
import { runCalc } from "~/calc/run-calc";
import { tooManyContext } from "~/context";
import { requireActor } from "~/http/request.server";
import type { Route } from "./+types/calc";

/** POST /api/v1/calc/<name>: JSON in, JSON out. What each takes and answers is at /api/v1/openapi.json. */
export async function action({ request, params, context }: Route.ActionArgs) {
  requireActor(context, "calc:use");
  if (context.get(tooManyContext))
    return Response.json({ message: "Too many requests lately. Wait a minute." }, { status: 429 });
  const calc = findCalc(params.name);
  if (!calc) return Response.json({ message: "There is no calculation of that name." }, { status: 404 });
  const text = await request.text();
  let body: unknown;
  try {
    body = JSON.parse(text);
  } catch {
    return Response.json({ message: "The body is not JSON.", fields: [] }, { status: 400 });
  }
  const answer = runCalc(calc, body);
  return Response.json(answer.body, { status: answer.status });
}
