import { api } from '../../../server/contract/index';
import type { Place } from '../../api/page';
import { q } from '../../api/query';

export const accountQueryOf = (producer: string, accountId: string) => q(api.accounts.read, { params: { producer, accountId } });

export const accountQuery = ({ params: { producer = '', accountId = '' } }: Place) => accountQueryOf(producer, accountId);

/** What a changed account makes stale: its name stands beside its stores and whoever sees them. */
export const accountStale = [api.accounts.list, api.accounts.read, api.people.places, api.stores.list, api.stores.read];
