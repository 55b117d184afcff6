/** The product's mark: a recovery cylinder, grey body and yellow shoulder. */
export const Mark = ({ height = 28 }: { height?: number }) => (
  <svg width={(height * 20) / 28} height={height} viewBox="0 0 20 28" aria-hidden="true" focusable="false">
    <path d="M7 1h6v4.5H7z" fill="#b9c3c6" />
    <path d="M2 13c0-5 3.5-7.5 8-7.5s8 2.5 8 7.5z" fill="#f5c400" />
    <path d="M2 13h16v12a2 2 0 0 1-2 2H4a2 2 0 0 1-2-2z" fill="#aab4b7" />
    <path d="M2 19.5h16" stroke="#3a4347" strokeWidth="1" opacity=".35" />
  </svg>
);

/** Mark and name together. */
export const Wordmark = () => (
  <span className="flex items-center gap-2.5 text-lg font-bold tracking-tight">
    <Mark />
    Tarebook
  </span>
);
