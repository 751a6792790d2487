import type { createBrowserRouter } from 'react-router-dom';
import { queryClient } from '../api/query';
import { anythingUnsent } from '../form/typed';
import { meQuery } from '../lib/me';
import { paths } from '../paths';
import { isSignedOut } from './signed-in';

/**
 * A session that ends while a page is open leads to sign-in and back. Words typed and not sent stay on the screen
 * instead: their form says what to do when it is sent.
 */
export function watchSession(router: ReturnType<typeof createBrowserRouter>) {
  queryClient.getQueryCache().subscribe((event) => {
    if (event.type !== 'updated' || event.action.type !== 'error' || !isSignedOut(event.action.error)) return;
    const wasIn = queryClient.getQueryData(meQuery.queryKey) !== undefined;
    if (wasIn && !anythingUnsent()) void leave(router);
  });
}

async function leave(router: ReturnType<typeof createBrowserRouter>) {
  const { pathname, search } = router.state.location;
  if (pathname.startsWith(paths.signIn())) return;
  await router.navigate(paths.signIn(pathname + search));
  queryClient.clear();
}
