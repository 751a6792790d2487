const MINUTE_MS = 60_000;

/** The page's clock moves by the half minute and may run behind the server's: the last minute counts as over. */
export const keyEnded = (endsAt: number, now: number): boolean => endsAt <= now + MINUTE_MS;
