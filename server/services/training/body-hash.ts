import { createHash } from 'node:crypto';
import type { AnswerInput } from '#shared/contracts/today.ts';

/** SHA-256 of an answer as sent: the same id with another body is another answer, and refused. */
export function bodyHash(answer: AnswerInput): Buffer {
  const { id, showingId, named, aufBefore, recognitionMs, namingMs, answeredAt } = answer;
  return createHash('sha256')
    .update(JSON.stringify([id, showingId, named, aufBefore, recognitionMs, namingMs, answeredAt]))
    .digest();
}
