import * as z from 'zod/mini';
import { fault, id, measure, producerParams, version, withProducer, withRetired, words } from './common';
import { endpoint } from './endpoint';
import { defrosts } from './words';

const entered = {
  name: words(80, 1),
  insideWidthIn: measure(10, 200),
  insideDepthIn: measure(10, 80),
  insideHeightIn: measure(10, 120),
  doors: z.int(fault('number')).check(z.minimum(1, fault('doors')), z.maximum(8, fault('doors'))),
  ratedPounds: measure(50, 10_000),
  defrost: z.enum(defrosts, fault('choice')),
};
const model = z.object({ id, ...entered, freezers: z.int(), retired: z.boolean(), version });
export type FreezerModel = z.output<typeof model>;

export const listModels = endpoint({
  id: 'models.list',
  method: 'get',
  path: '/api/:producer/models',
  access: { kind: 'may', action: 'read', subject: 'Model' },
  params: producerParams,
  query: withRetired,
  result: z.object({ models: z.array(model) }),
  problems: ['bad-input'],
});

export const createModel = endpoint({
  id: 'models.create',
  method: 'post',
  path: '/api/:producer/models',
  access: { kind: 'may', action: 'create', subject: 'Model' },
  params: producerParams,
  body: z.strictObject(entered),
  status: 201,
  result: model,
  problems: ['bad-input', 'not-allowed'],
});

/** A model's measures stay what they are while freezers of it stand somewhere: make a new model instead. */
export const changeModel = endpoint({
  id: 'models.change',
  method: 'patch',
  path: '/api/:producer/models/:modelId',
  access: { kind: 'may', action: 'update', subject: 'Model' },
  params: withProducer({ modelId: id }),
  body: z.strictObject({ version, ...z.partial(z.object(entered)).shape, retired: z.optional(z.boolean()) }),
  result: model,
  problems: ['bad-input', 'not-found', 'not-allowed', 'changed-meanwhile', 'still-in-use'],
});
