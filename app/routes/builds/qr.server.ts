import { create } from "qrcode";

/** A QR picture as one SVG path on a grid of `size` units a side, its quiet zone included. */
export type QrPicture = { size: number; path: string };

/** The light border that readers need, in modules. */
const QUIET = 4;

/** Draws a text as a QR picture, error level M. */
export function qrPicture(text: string): QrPicture {
  const { modules } = create(text, { errorCorrectionLevel: "M" });
  let path = "";
  for (let row = 0; row < modules.size; row++) {
    let column = 0;
    while (column < modules.size) {
      let run = 0;
      while (column + run < modules.size && modules.get(row, column + run)) run++;
      if (run > 0) path += `M${column + QUIET} ${row + QUIET}h${run}v1h-${run}z`;
      column += run + 1;
    }
  }
  return { size: modules.size + 2 * QUIET, path };
}
