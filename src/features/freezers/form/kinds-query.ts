import type { Result } from '../../../../server/contract/endpoint';
import { api } from '../../../../server/contract/index';
import type { Place } from '../../../api/page';
import { q } from '../../../api/query';

export interface Kinds {
  models: Result<typeof api.models.list>;
  products: Result<typeof api.products.list>;
}

/** What a freezer can be and what its lanes can hold; the retired too, since a freezer may still have one. */
export const kindsQueries = ({ params: { producer = '' } }: Place) => ({
  models: q(api.models.list, { params: { producer }, query: { retired: 'too' } }),
  products: q(api.products.list, { params: { producer }, query: { retired: 'too' } }),
});

interface Kind {
  id: string;
  name: string;
  retired: boolean;
}

/** The choices of a list: what is in use, and what the freezer has already. */
export const choicesOf = (kinds: Kind[], had: string[]) =>
  kinds.filter(({ id, retired }) => !retired || had.includes(id)).map(({ id, name }) => ({ value: id, label: name }));
