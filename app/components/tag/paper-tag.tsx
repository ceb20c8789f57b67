import "./paper-tag.css";
import { QrSvg } from "./qr-svg";

export type PaperTagProps = {
  nickname: string;
  code: string;
  kind: string;
  qr: { size: number; path: string };
  /** `label`: one label of 62 × 100 mm. `quarter`: one of the four on a sheet, 88 × 122 mm. */
  shape: "label" | "quarter";
  /** What it hangs on or lies in. */
  goesOn: string;
  /** A second print of the same tag on one page is no news to those who do not see it. */
  again?: boolean;
};

const SIZE = { label: { w: 62, h: 100 }, quarter: { w: 88, h: 122 } } as const;
const CORNER = 9;

/** A paper tag: cut corners, a hole with its reinforcing ring, the nickname on tape, the picture, the code in large. */
export function PaperTag({ nickname, code, kind, qr, shape, goesOn, again = false }: PaperTagProps) {
  const { w, h } = SIZE[shape];
  const edge = 0.4;
  const outline = `M${CORNER} ${edge}H${w - CORNER}L${w - edge} ${CORNER}V${h - edge}H${edge}V${CORNER}Z`;
  return (
    <div className={`paper-tag tag-${shape}`} aria-hidden={again || undefined}>
      <svg className="paper-tag-paper" viewBox={`0 0 ${w} ${h}`} aria-hidden="true">
        <path d={outline} fill="#fbfaf6" stroke="#22211e" strokeWidth=".5" strokeLinejoin="round" />
      </svg>
      <svg className="paper-tag-ring" viewBox="0 0 22 22" aria-hidden="true">
        <circle cx="11" cy="11" r="7.6" fill="none" stroke="#b9a06a" strokeWidth="5.2" />
        <circle cx="11" cy="11" r="10.2" fill="none" stroke="#22211e" strokeWidth=".7" />
        <circle className="paper-tag-hole" cx="11" cy="11" r="5" stroke="#22211e" strokeWidth=".9" />
        <path
          className="paper-tag-twine"
          d="M11 12C9 4 13-6 22-13 31-20 46-18 58-25M11 12C13 5 10-5 16-13 24-22 42-25 58-25"
          fill="none"
          stroke="#8a6f3d"
          strokeWidth="1.5"
          strokeLinecap="round"
        />
      </svg>
      <p className="paper-tag-tape">{nickname}</p>
      <p className="paper-tag-kind">{kind}</p>
      <QrSvg
        className="paper-tag-qr"
        size={qr.size}
        path={qr.path}
        name={again ? undefined : `QR code of ${nickname}`}
      />
      <p className="paper-tag-code">{code}</p>
      <p className="paper-tag-foot">
        <span>Scan or type this code</span>
        <span>{goesOn}</span>
      </p>
    </div>
  );
}
