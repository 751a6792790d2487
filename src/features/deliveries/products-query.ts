import { api } from '../../../server/contract/index';
import type { Place } from '../../api/page';
import { q } from '../../api/query';

/** The producer's bag sizes. */
export const productsQuery = ({ params }: Place) => q(api.products.list, { params: { producer: params.producer ?? '' } });
