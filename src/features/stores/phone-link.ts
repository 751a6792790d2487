/** What a phone dials. */
export const phoneLink = (phone: string) => `tel:${phone.replace(/[^+\d]/g, '')}`;
