const UUID = /^[\da-f]{8}-[\da-f]{4}-[\da-f]{4}-[\da-f]{4}-[\da-f]{12}$/i;

export const isId = (text: string): boolean => UUID.test(text);

/** The end of an id tells it from another, its start only when it was made; any other text stays whole. */
export const shortId = (text: string): string => (isId(text) ? text.slice(-8) : text);
