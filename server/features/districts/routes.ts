import { api } from '../../contract';
import { sql } from '../../db';
import { districtsView } from '../../db/views/accounts';
import { route } from '../../http/route';
import { changeDistrict, createDistrict, districtOf } from './actions';

export const districtsRoutes = [
  route(api.districts.list, ({ db }) => ({ districts: districtsView(db, sql`1`) })),

  route(api.districts.create, (ctx, { body }) => districtOf(ctx.db, createDistrict(ctx, body))),

  route(api.districts.change, (ctx, { params, body }) => {
    changeDistrict(ctx, params.districtId, body);
    return districtOf(ctx.db, params.districtId);
  }),
];
