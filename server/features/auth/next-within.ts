/** Where to go after signing in: a path of this portal, else its front page. */
export function nextWithin(next: string | undefined): string {
  if (!next || !/^\/(?![/\\])[\w\-./?=&%~:+,]*$/.test(next)) return '/';
  const resolved = new URL(next, 'http://portal.invalid');
  // `/.//elsewhere` resolves to a path that is itself an address of another host.
  const outside = resolved.host !== 'portal.invalid' || /^\/(\/|(api|dev)(\/|$))/.test(resolved.pathname);
  return outside ? '/' : resolved.pathname + resolved.search;
}
