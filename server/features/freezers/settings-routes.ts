import { api } from '../../contract';
import { route } from '../../http/route';
import { changeFreezer, createFreezer, settingsOf } from './actions';
import { takeSensorOff, tieSensor } from './installs';

export const freezerSettingsRoutes = [
  route(api.freezers.readSettings, ({ db }, { params }) => settingsOf(db, params.freezerId)),

  route(api.freezers.create, (ctx, { body }) => settingsOf(ctx.db, createFreezer(ctx, body))),

  route(api.freezers.change, (ctx, { params, body }) => {
    changeFreezer(ctx, params.freezerId, body);
    return settingsOf(ctx.db, params.freezerId);
  }),

  route(api.freezers.tieSensor, (ctx, { params, body }) => {
    tieSensor(ctx, params.freezerId, body);
    return undefined;
  }),

  route(api.freezers.takeSensorOff, (ctx, { params }) => {
    takeSensorOff(ctx, params.freezerId);
    return undefined;
  }),
];
