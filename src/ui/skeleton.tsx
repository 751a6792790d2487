/** A place held for what is on its way: give it the size of the real thing. */
export const Skeleton = ({ className = 'h-4' }: { className?: string }) => (
  <div aria-hidden className={`animate-pulse rounded-control bg-rule motion-reduce:animate-none ${className}`} />
);
