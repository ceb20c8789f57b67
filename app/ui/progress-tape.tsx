/** A tape with a tick for each piece and the bob at the one in hand. The words beside it say the same. */
export function ProgressTape({ of, done, width = 88 }: { of: number; done: number; width?: number }) {
  const ticks = Math.min(Math.max(1, of), 12);
  const at = (Math.min(done, of) / Math.max(1, of)) * width;
  return (
    <svg
      width={width + 8}
      height="15"
      viewBox={`0 0 ${width + 8} 15`}
      aria-hidden="true"
      className="flex-none"
    >
      <path d={`M1 10H${width + 1}`} stroke="var(--concrete-500)" />
      {Array.from({ length: ticks + 1 }, (_, i) => (i / ticks) * width + 1).map((x, i) => (
        <path key={x} d={`M${x} ${i === 0 || i === ticks ? 3 : 5}V10`} stroke="var(--concrete-500)" />
      ))}
      <path d={`M1 10H${at + 1}`} stroke="var(--ink)" strokeWidth="3" />
      <path d={`M${at + 1} 0V6`} stroke="var(--brass-ink)" strokeWidth="1.3" />
      <path d={`M${at - 1.6} 5h5.2l.5 2.6-3.1 6.2-3.1-6.2z`} fill="var(--brass-ink)" />
    </svg>
  );
}
