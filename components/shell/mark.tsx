/** Our own mark: a row, a cord, a bob. */
export function Mark({ size = 24 }: { size?: number }) {
  return (
    <svg width={(size * 22) / 24} height={size} viewBox="0 0 22 24" aria-hidden="true" className="shrink-0">
      <path d="M1 3h20" stroke="currentColor" strokeWidth="2.4" />
      <path d="M11 3v10" stroke="currentColor" strokeWidth="1.4" />
      <path d="M7.6 13h6.8l-1.1 4.4L11 22.5l-2.3-5.1z" fill="currentColor" />
    </svg>
  );
}
