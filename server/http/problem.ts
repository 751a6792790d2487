import type { ErrorRequestHandler, Request, Response } from 'express';
import type { Logger } from 'pino';
import en from '../../locales/en/problems.json';
import es from '../../locales/es/problems.json';
import { problems, problemTypePrefix, type FieldFault, type ProblemDocument, type ProblemType } from '../contract/problem';

/** Thrown anywhere on the way to an answer; becomes `application/problem+json`. */
export class ProblemError extends Error {
  constructor(
    readonly type: ProblemType,
    readonly params?: Record<string, string | number>,
    readonly errors?: FieldFault[],
  ) {
    super(type);
  }
}

export const problem = (type: ProblemType, params?: Record<string, string | number>, errors?: FieldFault[]) =>
  new ProblemError(type, params, errors);

/** What is not there and what is not this viewer's to see are the same to them. */
export function orNotFound<T>(row: T | null | undefined | false): T {
  if (!row) throw problem('not-found');
  return row;
}

/** One handler for everything thrown: known problems as they are, unknown ones logged and answered bare. */
export const problemHandler =
  (log: Logger, newId: () => string): ErrorRequestHandler =>
  (error: unknown, req, res, next) => {
    if (res.headersSent) return next(error);
    const known = recognise(error);
    if (known) return sendProblem(req, res, known);
    const requestId = newId();
    log.error({ err: error, requestId, method: req.method, path: req.path }, 'request failed');
    sendProblem(req, res, problem('server-error'), requestId);
  };

/** The type is for our own screens, which have its words; title and detail are for anybody else who asks. */
function sendProblem(req: Request, res: Response, { type, params, errors }: ProblemError, requestId?: string): void {
  const status = problems[type];
  const words = req.acceptsLanguages('en', 'es') === 'es' ? es : en;
  const { title, help } = words[type];
  const document: ProblemDocument = { type: problemTypePrefix + type, title, detail: filled(help, params), status, requestId, params, errors };
  if (status === 429) res.setHeader('retry-after', String(params?.seconds ?? 60));
  res.status(status).type('application/problem+json').send(JSON.stringify(document));
}

const filled = (text: string, params: Record<string, string | number> = {}): string =>
  text.replace(/\{\{(\w+)\}\}/g, (_, name: string) => String(params[name] ?? ''));

/** Errors of the libraries we stand on, by their own codes. */
function recognise(error: unknown): ProblemError | null {
  if (error instanceof ProblemError) return error;
  const code = codeOf(error);
  return code in byCode ? problem(byCode[code] ?? 'server-error') : null;
}

const byCode: Record<string, ProblemType> = {
  'entity.parse.failed': 'malformed-json',
  'entity.too.large': 'too-large',
  'request.size.invalid': 'malformed-json',
  'request.aborted': 'malformed-json',
  'encoding.unsupported': 'wrong-media-type',
  'charset.unsupported': 'wrong-media-type',
  'entity.verify.failed': 'malformed-json',
  'stream.encoding.set': 'malformed-json',
  'parameters.too.many': 'bad-input',
  SQLITE_FULL: 'storage-full',
  SQLITE_IOERR: 'storage-full',
  ENOSPC: 'storage-full',
  LIMIT_FILE_SIZE: 'photo-too-large',
  LIMIT_FILE_COUNT: 'too-many-photos',
  LIMIT_UNEXPECTED_FILE: 'too-many-photos',
  LIMIT_PART_COUNT: 'too-many-photos',
  LIMIT_FIELD_COUNT: 'bad-input',
  LIMIT_FIELD_VALUE: 'bad-input',
  LIMIT_FIELD_KEY: 'bad-input',
};

function codeOf(error: unknown): string {
  if (error instanceof URIError) return 'request.size.invalid';
  if (!(error instanceof Error)) return '';
  if ('code' in error && typeof error.code === 'string') return error.code;
  if ('type' in error && typeof error.type === 'string') return error.type;
  // Express's parsers and busboy mark what the sender got wrong by status alone.
  if ('status' in error && error.status === 400) return 'request.size.invalid';
  return MULTIPART.test(error.message) ? 'request.size.invalid' : '';
}

const MULTIPART = /^(Multipart: |Malformed part header|Unexpected end of form|Unsupported content type)/;
