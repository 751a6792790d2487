import { api } from '../../server/contract/index';
import type { Membership } from '../../server/contract/auth';
import { urlOf } from '../api/call';

/** Whose portal this is: the producer's picture, where there is one, and its name. */
export const ProducerName = ({ producer }: Pick<Membership, 'producer'>) => (
  <p className="flex items-center gap-2 text-small text-ink-3">
    {producer.logo && <img src={`${urlOf(api.settings.readLogo, { producer: producer.slug })}?${producer.logo}`} alt="" className="max-h-8 max-w-24 rounded-tag object-contain" />}
    {producer.name}
  </p>
);
