/** A path of this application to go on to after signing in, or nothing: never another site, whatever the link said. */
export function safeNext(wanted: string | null | undefined): string | null {
  if (!wanted || !/^\/[^/\\]/.test(wanted) || /[\\\u0000-\u0020\u007f]/.test(wanted)) return null;
  const { origin, pathname, search } = new URL(wanted, ORIGIN);
  if (origin !== ORIGIN || pathname.startsWith('//') || /^\/(api|dev|sign-in)(\/|$)/.test(pathname)) return null;
  return pathname + search;
}

// Any origin serves to see whether a path stays on it.
const ORIGIN = 'https://nilas.example';
