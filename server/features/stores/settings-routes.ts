import { api } from '../../contract';
import { route } from '../../http/route';
import { changeStore, createStore, settingsOf } from './actions';

export const storeSettingsRoutes = [
  route(api.stores.readSettings, ({ db }, { params }) => settingsOf(db, params.storeId)),

  route(api.stores.create, (ctx, { body }) => settingsOf(ctx.db, createStore(ctx, body))),

  route(api.stores.change, (ctx, { params, body }) => {
    changeStore(ctx, params.storeId, body);
    return settingsOf(ctx.db, params.storeId);
  }),
];
