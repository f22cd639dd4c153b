/** The mark: a lamp on the left of a wall, and the lee behind it. */
export function Mark() {
  return (
    <svg viewBox="0 0 24 24" width="22" height="22" aria-hidden="true">
      <circle cx="5" cy="12" r="4" fill="var(--lamp)" />
      <rect x="11" y="5" width="2.6" height="14" fill="var(--on-harbour)" />
      <path d="M14.4 6.6 22 3v18l-7.6-3.6z" fill="var(--on-harbour)" opacity="0.32" />
    </svg>
  );
}
