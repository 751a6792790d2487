import { api } from '../../../server/contract/index';
import { q } from '../../api/query';

export const districtsQueryOf = (producer: string) => q(api.districts.list, { params: { producer } });

/** What a changed district makes stale: its name stands beside its stores and whoever sees them. */
export const districtStale = [api.districts.list, api.people.places, api.stores.list, api.stores.read, api.freezers.list];
