/** The field's name in a form for a JSON pointer (RFC 6901) into the body; null for one into the path or the query. */
export function fieldOf(pointer: string): string | null {
  if (!pointer.startsWith('/') || /^\/(query|path)(\/|$)/.test(pointer)) return null;
  return pointer
    .slice(1)
    .split('/')
    .map((part) => part.replace(/~1/g, '/').replace(/~0/g, '~'))
    .join('.');
}
