import * as z from 'zod/mini';
import { subjects } from './ability';
import { day, id, instant, nextCursor, paging, producerParams } from './common';
import { endpoint } from './endpoint';
import { roles } from './words';

const filters = {
  subject: z.optional(z.enum(subjects)),
  subjectId: z.optional(z.string().check(z.maxLength(60))),
  actor: z.optional(id),
  /** Local days of the producer, both included. */
  from: z.optional(day),
  to: z.optional(day),
};

/** What was done, youngest first. People are named as they are called now; the trail itself keeps opaque ids. */
export const listAudit = endpoint({
  id: 'audit.list',
  method: 'get',
  path: '/api/:producer/audit',
  access: { kind: 'may', action: 'read', subject: 'Audit' },
  params: producerParams,
  query: z.strictObject({ ...paging, ...filters }),
  result: z.object({
    entries: z.array(
      z.object({
        seq: z.int(),
        at: instant,
        /** Null for the operator of the installation and the system itself. */
        actor: z.nullable(z.object({ id, name: z.string(), role: z.enum(roles) })),
        act: z.string(),
        subject: z.enum(subjects),
        subjectId: z.string(),
        /** JSON of what changed. */
        changes: z.string(),
      }),
    ),
    next: nextCursor,
  }),
  problems: ['bad-input'],
});

export const auditCsv = endpoint({
  id: 'audit.csv',
  method: 'get',
  path: '/api/:producer/audit.csv',
  access: { kind: 'may', action: 'read', subject: 'Audit' },
  params: producerParams,
  query: z.strictObject(filters),
  answer: 'file',
  problems: ['bad-input'],
});
