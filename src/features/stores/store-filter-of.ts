const trucks = ['today', 'late', 'none'] as const;

/** What the URL asks of a list of stores; what it could not mean is left out. */
export const storeFilterOf = (search: URLSearchParams) => ({
  q: search.get('q')?.slice(0, 120) || undefined,
  truck: trucks.find((known) => known === search.get('truck')),
  district: idIn(search.get('district')),
  account: idIn(search.get('account')),
  after: search.get('after') ?? undefined,
});

const idIn = (value: string | null) => (value && /^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/i.test(value) ? value : undefined);
