/** The closed catalogue of problems (RFC 9457): a type is also the key of its words in `locales/<language>/problems.json`. */
export const problems = {
  'bad-input': 400,
  'malformed-json': 400,
  'not-signed-in': 401,
  'bad-key': 401,
  'link-expired': 410,
  'link-other-browser': 409,
  'code-wrong': 422,
  'too-many-tries': 429,
  'too-many-requests': 429,
  'cross-site': 403,
  'not-allowed': 403,
  'not-found': 404,
  'too-large': 413,
  'wrong-media-type': 415,
  'senml-invalid': 422,
  'too-many-records': 413,
  'photo-unreadable': 422,
  'photo-too-large': 413,
  'too-many-photos': 422,
  'request-ended': 409,
  'request-changed': 409,
  'step-not-possible': 409,
  'day-needed': 422,
  'day-past': 422,
  'window-backwards': 422,
  'freezer-elsewhere': 422,
  'unknown-product': 422,
  'unknown-person': 422,
  'already-member': 409,
  'last-admin': 409,
  'scope-needed': 422,
  'scope-unknown': 422,
  'truck-changed': 409,
  'time-ahead': 422,
  'changed-meanwhile': 409,
  'still-in-use': 409,
  'place-unknown': 422,
  'setup-impossible': 422,
  'unknown-sensor': 422,
  'sensor-elsewhere': 409,
  'seeing-only': 403,
  'storage-full': 503,
  'server-error': 500,
} as const;

export type ProblemType = keyof typeof problems;

/** Where a field is wrong: a JSON pointer into the body (or `/query/x`, `/path/x`) and the key of the words. */
export interface FieldFault {
  pointer: string;
  fault: string;
  params?: Record<string, string | number>;
}

export interface ProblemDocument {
  type: string;
  title: string;
  detail: string;
  status: number;
  requestId?: string;
  params?: Record<string, string | number>;
  errors?: FieldFault[];
}

export const problemTypePrefix = 'urn:nilas:problem:';

export const problemTypeOf = (document: { type: string }): ProblemType => {
  const type = document.type.slice(problemTypePrefix.length);
  return isProblemType(type) ? type : 'server-error';
};

const isProblemType = (type: string): type is ProblemType => type in problems;
