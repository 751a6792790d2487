import { api } from '../../contract';
import { isNull, products, sql } from '../../db';
import { modelsView, productsView } from '../../db/views/products';
import { route } from '../../http/route';
import { changeProduct, createProduct, productOf } from './actions';
import { changeModel, createModel, modelOf } from './model-actions';

export const productsRoutes = [
  route(api.products.list, ({ db }, { query }) => ({ products: productsView(db, query.retired ? undefined : isNull(products.retiredAt)) })),

  route(api.products.create, (ctx, { body }) => productOf(ctx.db, createProduct(ctx, body))),

  route(api.products.change, (ctx, { params, body }) => {
    changeProduct(ctx, params.productId, body);
    return productOf(ctx.db, params.productId);
  }),

  route(api.models.list, ({ db }, { query }) => ({ models: modelsView(db, query.retired ? sql`1` : sql`m.retired_at is null`) })),

  route(api.models.create, (ctx, { body }) => modelOf(ctx.db, createModel(ctx, body))),

  route(api.models.change, (ctx, { params, body }) => {
    changeModel(ctx, params.modelId, body);
    return modelOf(ctx.db, params.modelId);
  }),
];
