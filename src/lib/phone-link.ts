/** What a phone dials. */
export const phoneLink = (phone: string) => `tel:${phone.replace(/[^+\d]/g, '')}`;

/** A number that stays on one line. */
export const phoneText = (phone: string) => phone.replaceAll(' ', '\u00a0').replaceAll('-', '\u2011');
