import type { z } from "zod";
import { jsonSchema } from "./openapi";

/** One line of a schema's description, for people. */
export type FieldLine = { path: string; type: string; needed: boolean; words: string };

type Node = {
  type?: string | string[];
  description?: string;
  properties?: Record<string, Node>;
  required?: string[];
  items?: Node;
  prefixItems?: Node[];
  anyOf?: Node[];
  oneOf?: Node[];
  enum?: unknown[];
  const?: unknown;
  additionalProperties?: boolean | Node;
};

const typeOf = (node: Node): string => {
  if (node.const !== undefined) return JSON.stringify(node.const);
  if (node.enum) return node.enum.map((one) => JSON.stringify(one)).join(" or ");
  if (node.anyOf ?? node.oneOf)
    return [...new Set((node.anyOf ?? node.oneOf ?? []).map(typeOf))].join(" or ");
  if (node.type === "array") return `list of ${node.items ? typeOf(node.items) : "values"}`;
  return Array.isArray(node.type) ? node.type.join(" or ") : (node.type ?? "value");
};

function walk(node: Node, path: string, needed: boolean, lines: FieldLine[]): void {
  if (path !== "") lines.push({ path, type: typeOf(node), needed, words: node.description ?? "" });
  for (const [name, child] of Object.entries(node.properties ?? {}))
    walk(child, path === "" ? name : `${path}.${name}`, node.required?.includes(name) ?? false, lines);
  if (node.items?.properties || node.items?.oneOf || node.items?.anyOf)
    inside({ ...node.items, description: undefined }, `${path}[]`, lines);
  for (const choice of node.oneOf ?? node.anyOf ?? []) inside(choice, path, lines);
}

/** The fields of an object that has its line already, or needs none. */
function inside(node: Node, path: string, lines: FieldLine[]): void {
  const under: FieldLine[] = [];
  walk(node, "", true, under);
  for (const line of under) {
    const full = path === "" ? line.path : `${path}.${line.path}`;
    if (!lines.some((one) => one.path === full && one.type === line.type))
      lines.push({ ...line, path: full });
  }
}

/** The fields of a schema one by one, with their paths: `stands[].height`. */
export function fieldLines(schema: z.ZodType, io: "input" | "output"): FieldLine[] {
  const lines: FieldLine[] = [];
  walk(jsonSchema(schema, io) as Node, "", true, lines);
  return lines;
}
