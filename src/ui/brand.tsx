/** Three lines of new ice that the wind has begun to ripple. */
export const BrandMark = ({ className = 'h-6' }: { className?: string }) => (
  <svg viewBox="0 0 36 24" aria-hidden className={className} fill="none" strokeLinecap="round" strokeWidth="2">
    <path d="M12 5.5c3.2 0 4-1.1 6.8-1.1s3.8 2.2 6.8 2.2 4.4-3.4 8.4-3.4" className="stroke-ice-2" />
    <path d="M2 12.5c4.6 0 6-1.4 9.6-1.4s4.8 2.8 8.6 2.8 5.4-4.2 9.8-4.2" className="stroke-fjord" />
    <path d="M7 19.6c3.6 0 4.8-1.1 7.8-1.1s4 2.2 7.2 2.2 4.6-3.2 8.6-3.2" className="stroke-ink" />
  </svg>
);

/** Our mark and name. */
export const Brand = () => (
  <span className="inline-flex items-center gap-2.5 text-ink">
    <BrandMark />
    <span className="text-[1.3125rem] leading-none font-bold tracking-[-0.02em]">nilas</span>
  </span>
);
