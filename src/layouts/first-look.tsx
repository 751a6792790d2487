import { Skeleton } from '../ui/skeleton';

/** The shape of the page that is coming, before anything of it is known but its address. */
export function FirstLook() {
  const path = location.pathname;
  if (path.startsWith('/sign-in')) return <CardLook />;
  if (/\/stores\/[^/]+/.test(path)) return <StoreLook />;
  return <ListLook />;
}

const CardLook = () => (
  <main aria-busy="true" className="mx-auto mt-24 grid max-w-md gap-4 px-4">
    <Skeleton className="h-8 w-40" />
    <Skeleton className="h-48" />
  </main>
);

const StoreLook = () => (
  <main aria-busy="true" className="mx-auto grid max-w-[1160px] gap-6 px-4 py-5 sm:px-6">
    <Skeleton className="h-7 w-28" />
    <Skeleton className="h-9 w-64" />
    <Skeleton className="h-72 sm:h-36" />
    <Skeleton className="h-96" />
  </main>
);

const ListLook = () => (
  <main aria-busy="true" className="grid gap-4 px-4 py-5 lg:ml-[196px] lg:px-6">
    <Skeleton className="h-8 w-40" />
    <Skeleton className="h-11" />
    {Array.from({ length: 8 }, (_, row) => (
      <Skeleton key={row} className="h-13" />
    ))}
  </main>
);
