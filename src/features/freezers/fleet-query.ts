import type { QueryInput } from '../../../server/contract/endpoint';
import { api } from '../../../server/contract/index';
import { queryFrom } from '../../table/query-from';

const selection = ['q', 'district', 'account', 'store'] as const;
/** What narrows the list; the URL also says how it is looked at. */
export const filterNames = [...selection, 'show'] as const;

export type FleetQuery = QueryInput<typeof api.freezers.map>;

export const fleetQuery = (search: URLSearchParams): FleetQuery => queryFrom(api.freezers.map, filterNames, search);

/** Of the list: the selection and the page. */
export const listQuery = (search: URLSearchParams): QueryInput<typeof api.freezers.list> => ({
  ...queryFrom(api.freezers.list, [...filterNames, 'after'], search),
  limit: '50',
});

export const digestQuery = (search: URLSearchParams): QueryInput<typeof api.freezers.digest> => queryFrom(api.freezers.digest, selection, search);
