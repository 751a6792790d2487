import { api } from '../../contract';
import { and, contains, sql } from '../../db';
import { accountsView } from '../../db/views/accounts';
import { route } from '../../http/route';
import { pageOf, readCursor } from '../cursor';
import { accountOf, changeAccount, createAccount } from './actions';

export const accountsRoutes = [
  route(api.accounts.list, ({ db }, { query }) => {
    const { limit = 50, q, retired } = query;
    const cursor = readCursor(query.after, ['string', 'string']);
    const where = and(
      retired ? sql`a.retired_at is not null` : sql`a.retired_at is null`,
      q ? contains(q, sql`a.name`, sql`a.number`) : undefined,
      cursor ? sql`(a.name, a.id) > (${cursor[0]}, ${cursor[1]})` : undefined,
    );
    const page = pageOf(accountsView(db, where ?? sql`1`, limit + 1), limit, ({ name, id }) => [name, id]);
    return { accounts: page.rows, next: page.next };
  }),

  route(api.accounts.read, ({ db }, { params }) => accountOf(db, params.accountId)),

  route(api.accounts.create, (ctx, { body }) => accountOf(ctx.db, createAccount(ctx, body))),

  route(api.accounts.change, (ctx, { params, body }) => {
    changeAccount(ctx, params.accountId, body);
    return accountOf(ctx.db, params.accountId);
  }),
];
