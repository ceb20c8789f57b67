import { z } from "zod";
import type { Calc } from "./calc";
import { CALCS } from "./registry";

const json = (schema: unknown, example?: unknown) => ({
  "application/json": { schema, ...(example === undefined ? {} : { example }) },
});
const message = { type: "object", required: ["message"], properties: { message: { type: "string" } } };
const said = (description: string, schema: unknown = message) => ({ description, content: json(schema) });

/** JSON Schema (2020-12, as OpenAPI 3.1 takes it) of what a caller sends or gets. */
export function jsonSchema(schema: z.ZodType, io: "input" | "output"): Record<string, unknown> {
  const { $schema: _, ...rest } = z.toJSONSchema(schema, { io, target: "draft-2020-12" }) as Record<
    string,
    unknown
  >;
  return rest;
}

function pathOf(calc: Calc) {
  const [first] = calc.examples;
  return {
    post: {
      operationId: calc.name,
      summary: calc.title,
      description: [calc.summary, ...(calc.cautions ?? [])].join("\n\n"),
      tags: ["calculations"],
      requestBody: {
        required: true,
        content: {
          "application/json": {
            schema: jsonSchema(calc.input, "input"),
            examples: Object.fromEntries(
              calc.examples.map(({ title, input }, i) => [
                `example${i + 1}`,
                { summary: title, value: input },
              ]),
            ),
          },
        },
      },
      responses: {
        200: {
          description: "The result.",
          content: json(
            {
              type: "object",
              required: ["calc", "result", "cautions"],
              properties: {
                calc: { const: calc.name },
                result: jsonSchema(calc.output, "output"),
                cautions: { type: "array", items: { type: "string" } },
              },
            },
            first && { calc: calc.name, result: first.output, cautions: calc.cautions ?? [] },
          ),
        },
        400: said("Fields that cannot be read, each with its path.", {
          type: "object",
          required: ["message", "fields"],
          properties: {
            message: { type: "string" },
            fields: {
              type: "array",
              items: {
                type: "object",
                required: ["path", "message"],
                properties: { path: { type: "string" }, message: { type: "string" } },
              },
            },
          },
        }),
        401: said("No sign-in and no token, or one that is not good any more."),
        413: said("The body is too long."),
        422: said("The figures are well formed and nothing can come of them: why, in a sentence."),
        429: said("Too many requests lately."),
      },
    },
  };
}

/** The OpenAPI 3.1 description of the calculations, made from their schemas. */
export function openApi(origin: string) {
  return {
    openapi: "3.1.0",
    info: {
      title: "Plumbay calculations",
      version: "1",
      description:
        "Suspension layout sums. Lengths are millimetres, angles degrees, unless a field says otherwise. The results are an aid to layout, not an engineering certificate.",
      license: { name: "MIT", identifier: "MIT" },
    },
    servers: [{ url: `${origin}/api/v1` }],
    security: [{ token: [] }, { session: [] }],
    paths: Object.fromEntries(CALCS.map((calc) => [`/calc/${calc.name}`, pathOf(calc)])),
    components: {
      securitySchemes: {
        token: { type: "http", scheme: "bearer", description: "Made, named and revoked in Setup." },
        session: { type: "apiKey", in: "cookie", name: "plumbay_session" },
      },
    },
  };
}
