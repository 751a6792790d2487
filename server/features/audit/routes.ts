import { api } from '../../contract';
import type { auditCsv } from '../../contract/audit';
import type { Query } from '../../contract/endpoint';
import { auditView, type AuditFilter, type AuditRow } from '../../db/views/audit';
import { addDays, dayOf, localMinute, startOfDay } from '../../domain/civil';
import type { ProducerContext } from '../../http/context';
import { sendCsv } from '../../http/csv';
import { route } from '../../http/route';
import { pageOf, readCursor } from '../cursor';
import { fileWords } from '../words';

export const auditRoutes = [
  route(api.audit.list, ({ db, producer }, { query: { limit = 50, after, ...filter } }) => {
    const cursor = readCursor(after, ['number']);
    const rows = auditView(db, filterOf(filter, producer.timeZone), cursor ? Number(cursor[0]) : null, limit + 1);
    const page = pageOf(rows, limit, ({ seq }) => [seq]);
    return { entries: page.rows, next: page.next };
  }),

  route(api.audit.csv, async (ctx, { query, res }) => {
    const { producer, now } = ctx;
    await sendCsv(res, `${producer.slug}-changes-${dayOf(now, producer.timeZone)}.csv`, auditTable(ctx, filterOf(query, producer.timeZone)));
    return undefined;
  }),
];

const filterOf = ({ from, to, ...filter }: Query<typeof auditCsv>, timeZone: string): AuditFilter => ({
  ...filter,
  from: from ? startOfDay(from, timeZone) : undefined,
  to: to ? startOfDay(addDays(to, 1), timeZone) : undefined,
});

const BATCH = 500;

/** The whole trail that was asked for, youngest first; acts and values as they are kept. */
function* auditTable({ db, language, producer }: ProducerContext, filter: AuditFilter): Generator<string[][]> {
  const t = fileWords(language);
  yield [['seq', 'at', 'who', 'role', 'act', 'subject', 'subjectId', 'changes'].map((head) => t(`audit.${head}`))];
  for (let before: number | null = null, rows: AuditRow[]; (rows = auditView(db, filter, before, BATCH)).length > 0; before = rows.at(-1)?.seq ?? 0) {
    yield rows.map(({ seq, at, actor, act, subject, subjectId, changes }) => [
      String(seq),
      localMinute(at, producer.timeZone),
      actor?.name ?? t('audit.operator'),
      actor?.role ?? '',
      act,
      subject,
      subjectId,
      changes,
    ]);
  }
}
