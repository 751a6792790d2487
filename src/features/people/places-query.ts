import type { Result } from '../../../server/contract/endpoint';
import { api } from '../../../server/contract/index';
import type { Place } from '../../api/page';
import { q } from '../../api/query';

export type Places = Result<typeof api.people.places>;

/** The producer's districts and accounts. */
export const placesQuery = ({ params }: Place) => q(api.people.places, { params: { producer: params.producer ?? '' } });
