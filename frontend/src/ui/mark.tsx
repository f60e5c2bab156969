/** Three discs of a string: the mark of the product. */
export function Mark({ heightPx = 26 }: { heightPx?: number }) {
  return (
    <svg width={(heightPx * 22) / 26} height={heightPx} viewBox="0 0 22 26" aria-hidden="true" focusable="false">
      <g fill="none" stroke="var(--bg-glass)" strokeWidth="1.6" strokeLinejoin="round">
        <path d="M11 0v3M3 8c0-3 3-5 8-5s8 2 8 5z" />
        <path d="M11 8v2M3 15c0-3 3-5 8-5s8 2 8 5z" />
        <path d="M11 15v2M3 22c0-3 3-5 8-5s8 2 8 5zM11 22v4" />
      </g>
    </svg>
  );
}
