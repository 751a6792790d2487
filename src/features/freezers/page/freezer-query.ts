import { api } from '../../../../server/contract/index';
import type { Place } from '../../../api/page';
import { q } from '../../../api/query';

const refreshMs = 30_000;

/** The freezer of the path, asked anew while it is looked at. */
export const freezerQuery = ({ params }: Place) =>
  q(api.freezers.read, { params: { producer: params.producer ?? '', freezerId: params.freezerId ?? '' } }, { everyMs: refreshMs });
