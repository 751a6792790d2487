/** Something is under way; the words beside it say what. */
export const Spinner = () => (
  <svg viewBox="0 0 16 16" aria-hidden className="size-4 shrink-0 animate-spin" fill="none" stroke="currentColor" strokeWidth="2" strokeLinecap="round">
    <circle cx="8" cy="8" r="6" opacity=".25" />
    <path d="M8 2a6 6 0 0 1 6 6" />
  </svg>
);
