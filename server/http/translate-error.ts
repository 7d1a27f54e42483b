import { Problem } from './problem.ts';

interface Coded {
  code?: unknown;
  type?: unknown;
  message?: unknown;
  cause?: unknown;
}

/** PostgreSQL codes (manual, appendix A) and socket errors that mean "the database is away", not "we erred". */
const AWAY = new Set([
  '57P01',
  '57P02',
  '57P03',
  '53300',
  '08000',
  '08001',
  '08003',
  '08006',
  'ECONNREFUSED',
  'ECONNRESET',
]);

/** Any thrown value as a Problem. What is not expected becomes `our-fault` and tells its reader nothing more. */
export function translateError(thrown: unknown): Problem {
  if (thrown instanceof Problem) return thrown;
  const error = (thrown ?? {}) as Coded;
  const inner = (error.cause ?? {}) as Coded;
  const code = String(error.code ?? inner.code ?? '');
  if (
    AWAY.has(code) ||
    /timeout exceeded when trying to connect/.test(String(inner.message ?? error.message ?? ''))
  ) {
    return new Problem('unavailable', 'The database does not answer. Try again in a moment.', {
      retryAfter: 2,
    });
  }
  if (code === '40001' || code === '40P01') {
    return new Problem('conflict', 'Two changes met. Try again.', { retryAfter: 1 });
  }
  switch (error.type) {
    case 'entity.too.large':
      return new Problem('too-large', 'What you sent is larger than this place takes.');
    case 'entity.parse.failed':
      return new Problem('invalid', 'The body is not valid JSON.');
    case 'encoding.unsupported':
    case 'charset.unsupported':
      return new Problem('wrong-media', 'Send JSON in UTF-8.');
    case 'request.aborted':
      return new Problem('invalid', 'The request ended before its body did.');
  }
  return new Problem(
    'our-fault',
    'It has been written down. Try again; if it stays, tell your administrator.',
  );
}
