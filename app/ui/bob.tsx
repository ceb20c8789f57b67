/** A plumb bob on its line; `swinging` while something is awaited (still when reduced motion is asked for). */
export function Bob({
  size = 44,
  swinging = false,
  className = "",
}: {
  size?: number;
  swinging?: boolean;
  className?: string;
}) {
  return (
    <svg
      className={`${swinging ? "bob-swing" : ""} ${className}`}
      width={size * 0.45}
      height={size}
      viewBox="-10 -88 20 90"
      aria-hidden="true"
      focusable="false"
    >
      <path d="M0-88V-42" stroke="var(--brass)" strokeWidth="1.8" />
      <path d="M-2.6-42h5.2v4.4h-5.2z" fill="var(--brass-ink)" />
      <path
        d="M-3.4-37.6h6.8C8.6-34.4 9.6-27 7.2-20L1.6-5.2h-3.2L-7.2-20C-9.6-27-8.6-34.4-3.4-37.6z"
        fill="var(--brass)"
      />
      <path
        d="M-4.6-35.2C-7.6-31-7.4-25.6-5.6-20.4L-1.6-8.4C-3.2-18-5-27-4.6-35.2z"
        fill="var(--brass-wash)"
        opacity=".55"
      />
      <path d="M-1.6-5.2h3.2L0 0z" fill="var(--ink)" />
    </svg>
  );
}

/** The loading state: a bob that swings and settles, with words. Shows itself after 300 ms. */
export function BobLoading({ words }: { words: string }) {
  return (
    <p className="appear-late flex items-center gap-3 text-concrete-700" role="status">
      <Bob swinging />
      <span>{words}</span>
    </p>
  );
}
