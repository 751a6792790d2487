import { useEffect, useState } from 'react';

const tickMs = 30_000;

/** The time, anew every half minute, so that ages and windows on the page stay true. */
export function useNow(): number {
  const [now, setNow] = useState(Date.now);
  useEffect(() => {
    const timer = setInterval(() => setNow(Date.now()), tickMs);
    return () => clearInterval(timer);
  }, []);
  return now;
}
