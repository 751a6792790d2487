/** Two waves and a thin sheet of new ice: our mark, with the name beside it. */
export const Mark = () => (
  <span className="flex items-center gap-2.5 text-[20px] leading-none font-bold tracking-tight text-ink">
    <svg width="36" height="24" viewBox="0 0 39 26" aria-hidden="true" fill="none" strokeLinecap="round">
      <path d="M1 15.5c6-6.2 12-6.2 18.5-1.2S32 19 38 12.5" className="stroke-fjord" strokeWidth="3.2" />
      <path d="M6 22.5c5-3.4 9.5-3 13.5-.4 4 2.6 8.5 2.8 13.5-1.2" className="stroke-ice-2" strokeWidth="2.4" />
      <path d="M8 8.2c4.5-3.6 8-3.4 12-1" className="stroke-ink" strokeWidth="2.4" opacity=".85" />
    </svg>
    nilas
  </span>
);
