import { api } from '../../../server/contract/index';
import type { Place } from '../../api/page';
import { q } from '../../api/query';

const refreshMs = 30_000;

export const storeQueryOf = (producer: string, storeId: string) => q(api.stores.read, { params: { producer, storeId } }, { everyMs: refreshMs });

/** The store of the path, asked anew while it is looked at. */
export const storeQuery = ({ params }: Place) => storeQueryOf(params.producer ?? '', params.storeId ?? '');
