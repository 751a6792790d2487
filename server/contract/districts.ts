import * as z from 'zod/mini';
import { id, producerParams, version, withProducer, words } from './common';
import { endpoint } from './endpoint';

const district = z.object({ id, name: z.string(), stores: z.int(), retired: z.boolean(), version });
export type District = z.output<typeof district>;

/** All of them by name, the retired last. */
export const listDistricts = endpoint({
  id: 'districts.list',
  method: 'get',
  path: '/api/:producer/districts',
  access: { kind: 'may', action: 'read', subject: 'District' },
  params: producerParams,
  result: z.object({ districts: z.array(district) }),
  problems: [],
});

export const createDistrict = endpoint({
  id: 'districts.create',
  method: 'post',
  path: '/api/:producer/districts',
  access: { kind: 'may', action: 'create', subject: 'District' },
  params: producerParams,
  body: z.strictObject({ name: words(120, 1) }),
  status: 201,
  result: district,
  problems: ['bad-input', 'not-allowed'],
});

export const changeDistrict = endpoint({
  id: 'districts.change',
  method: 'patch',
  path: '/api/:producer/districts/:districtId',
  access: { kind: 'may', action: 'update', subject: 'District' },
  params: withProducer({ districtId: id }),
  body: z.strictObject({ version, name: z.optional(words(120, 1)), retired: z.optional(z.boolean()) }),
  result: district,
  problems: ['bad-input', 'not-found', 'not-allowed', 'changed-meanwhile', 'still-in-use'],
});
