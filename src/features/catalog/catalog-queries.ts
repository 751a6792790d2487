import { api } from '../../../server/contract/index';
import { q } from '../../api/query';

/** With what is out of use, last. */
export const productsQueryOf = (producer: string) => q(api.products.list, { params: { producer }, query: { retired: 'too' } });
export const modelsQueryOf = (producer: string) => q(api.models.list, { params: { producer }, query: { retired: 'too' } });

/** A product's name stands in its lanes. */
export const productStale = [api.products.list, api.stores.read, api.freezers.read];
export const modelStale = [api.models.list, api.stores.read, api.freezers.read];
