import Papa from "papaparse";

/**
 * Cells that a table program would take for a formula, but for lengths and numbers such as −1/8 or +26 1/2, which stay as
 * they were typed.
 */
const FORMULA = /^(?![-+]?[\d\s./,'"-]*(?:mm|cm|m|in|ft)?\s*$)[=+\-@\t\r]/;

/** Rows as comma-separated values (RFC 4180), with the mark at the head by which table programs know UTF-8. */
export function csvOf(
  head: readonly string[],
  rows: readonly (readonly (string | number | null)[])[],
): string {
  const text = Papa.unparse(
    { fields: [...head], data: rows.map((row) => row.map((cell) => cell ?? "")) },
    { newline: "\r\n", escapeFormulae: FORMULA },
  );
  return `\uFEFF${text}\r\n`;
}

/** A response that is kept as a file of that name. */
export const csvResponse = (name: string, text: string): Response =>
  new Response(text, {
    headers: {
      "Content-Type": "text/csv; charset=utf-8",
      "Content-Disposition": `attachment; filename="${name.replace(/[^\w.-]+/g, "-")}"`,
    },
  });
