import * as z from 'zod/mini';
import { isGtin } from '../domain/gtin';
import { fault, id, measure, producerParams, version, withProducer, withRetired, words } from './common';
import { endpoint } from './endpoint';

const entered = {
  name: words(80, 1),
  bagPounds: measure(1, 100),
  /** GTIN-8, -12, -13 or -14 with its check digit; empty where the bag has none. */
  gtin: z.string(fault('text')).check(z.overwrite((text) => text.replace(/[\s-]/g, '')), z.refine((text) => text === '' || isGtin(text), fault('gtin'))),
};
const product = z.object({ id, name: z.string(), bagPounds: z.number(), gtin: z.string(), retired: z.boolean(), version });
export type Product = z.output<typeof product>;

/** By bag size, the retired ones last. */
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
  body: z.strictObject(entered),
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
  body: z.strictObject({ version, ...z.partial(z.object(entered)).shape, retired: z.optional(z.boolean()) }),
  result: product,
  problems: ['bad-input', 'not-found', 'not-allowed', 'changed-meanwhile', 'still-in-use'],
});
