import { api } from '../../../server/contract/index';
import type { Place } from '../../api/page';
import { q } from '../../api/query';

const refreshMs = 30_000;

/** The store of the path, asked anew while it is looked at. */
export const storeQuery = ({ params }: Place) =>
  q(api.stores.read, { params: { producer: params.producer ?? '', storeId: params.storeId ?? '' } }, { everyMs: refreshMs });
