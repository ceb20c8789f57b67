type Mark = { label: string; x: number; y: number };

/** Room round the marks on the picture, as a share of their spread. */
const MARGIN = 0.16;

/** The bay's control marks from above, at one scale, A to B snapped in chalk; the nose to the right, left side up. */
export function MarksPlan({ marks, spread }: { marks: readonly Mark[]; spread: string | null }) {
  const a = marks.find((mark) => mark.label === "A");
  const b = marks.find((mark) => mark.label === "B");
  const xs = marks.map((mark) => mark.x);
  const ys = marks.map((mark) => mark.y);
  const width = Math.max(1, Math.max(...xs) - Math.min(...xs));
  const k = 640 / (width * (1 + 2 * MARGIN));
  const height = Math.max(150, (Math.max(...ys) - Math.min(...ys)) * k + 130);
  const at = ({ x, y }: Mark) => ({
    x: (x - Math.min(...xs) + width * MARGIN) * k,
    y: 60 + (Math.max(...ys) - y) * k,
  });
  const others = marks.filter((mark) => mark !== a && mark !== b);
  return (
    <svg
      viewBox={`0 0 640 ${height}`}
      className="mx-auto block max-h-[44dvh] w-full"
      role="img"
      aria-label="The control marks of this bay, from above"
    >
      {a && b ? <ChalkLine from={at(a)} to={at(b)} words={spread} /> : null}
      {others.flatMap((mark) =>
        [a, b].map((end) => {
          if (!end) return null;
          const [p, q] = [at(mark), at(end)];
          return (
            <path
              key={mark.label + end.label}
              d={`M${p.x} ${p.y}L${q.x} ${q.y}`}
              opacity={0.4}
              className="stroke-line"
            />
          );
        }),
      )}
      {marks.map((mark) => {
        const { x, y } = at(mark);
        const inHand = mark === a || mark === b;
        return (
          <g key={mark.label}>
            {inHand ? (
              <circle cx={x} cy={y} r={15} fill="none" strokeWidth={2.4} className="stroke-brass-ink" />
            ) : null}
            <circle cx={x} cy={y} r={6} strokeWidth={1.4} className="fill-brass stroke-ink" />
            <circle cx={x} cy={y} r={1.6} className="fill-ink" />
            <text
              x={x}
              y={inHand ? y - 22 : y + 36}
              textAnchor="middle"
              fontSize={30}
              fontWeight={800}
              className="fill-ink font-label"
            >
              {mark.label}
            </text>
          </g>
        );
      })}
    </svg>
  );
}

type Spot = { x: number; y: number };

function ChalkLine({ from, to, words }: { from: Spot; to: Spot; words: string | null }) {
  const line = `M${from.x} ${from.y}L${to.x} ${to.y}`;
  return (
    <>
      <path d={line} strokeWidth={6.6} opacity={0.16} strokeLinecap="round" className="stroke-line" />
      <path d={line} strokeWidth={2.2} className="stroke-line" />
      {words ? (
        <text
          x={(from.x + to.x) / 2}
          y={(from.y + to.y) / 2 + 30}
          textAnchor="middle"
          fontSize={22}
          fontWeight={700}
          className="fill-ink"
        >
          {words}
        </text>
      ) : null}
    </>
  );
}
