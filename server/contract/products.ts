import * as z from 'zod/mini';
import { isGtin } from '../domain/gtin';
import { fault, id, measure, producerParams, version, withProducer, words } from './common';
import { endpoint } from './endpoint';
import { defrosts } from './words';

const productEntered = {
  name: words(80, 1),
  bagPounds: measure(1, 100),
  /** GTIN-8, -12, -13 or -14 with its check digit; empty where the bag has none. */
  gtin: z.string(fault('text')).check(z.overwrite((text) => text.replace(/[\s-]/g, '')), z.refine((text) => text === '' || isGtin(text), fault('gtin'))),
};
const product = z.object({ id, name: z.string(), bagPounds: z.number(), gtin: z.string(), retired: z.boolean(), version });
export type Product = z.output<typeof product>;

/** By bag size; the retired ones, last, only when asked for. */
const withRetired = z.strictObject({ retired: z.optional(z.literal('too')) });

export const listProducts = endpoint({
  id: 'products.list',
  method: 'get',
  path: '/api/:producer/products',
  access: { kind: 'may', action: 'read', subject: 'Product' },
  params: producerParams,
  query: withRetired,
  result: z.object({ products: z.array(product) }),
  problems: ['bad-input'],
});

export const createProduct = endpoint({
  id: 'products.create',
  method: 'post',
  path: '/api/:producer/products',
  access: { kind: 'may', action: 'create', subject: 'Product' },
  params: producerParams,
  body: z.strictObject(productEntered),
  status: 201,
  result: product,
  problems: ['bad-input', 'not-allowed'],
});

/** A bag's pounds stay what they are once it hangs in a lane or was delivered: make a new product instead. */
export const changeProduct = endpoint({
  id: 'products.change',
  method: 'patch',
  path: '/api/:producer/products/:productId',
  access: { kind: 'may', action: 'update', subject: 'Product' },
  params: withProducer({ productId: id }),
  body: z.strictObject({ version, ...z.partial(z.object(productEntered)).shape, retired: z.optional(z.boolean()) }),
  result: product,
  problems: ['bad-input', 'not-found', 'not-allowed', 'changed-meanwhile', 'still-in-use'],
});

const modelEntered = {
  name: words(80, 1),
  insideWidthIn: measure(10, 200),
  insideDepthIn: measure(10, 80),
  insideHeightIn: measure(10, 120),
  doors: z.int(fault('number')).check(z.minimum(1, fault('doors')), z.maximum(8, fault('doors'))),
  ratedPounds: measure(50, 10_000),
  defrost: z.enum(defrosts, fault('choice')),
};
const model = z.object({ id, ...modelEntered, freezers: z.int(), retired: z.boolean(), version });
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
  body: z.strictObject(modelEntered),
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
  body: z.strictObject({ version, ...z.partial(z.object(modelEntered)).shape, retired: z.optional(z.boolean()) }),
  result: model,
  problems: ['bad-input', 'not-found', 'not-allowed', 'changed-meanwhile', 'still-in-use'],
});
