import { expect, it } from 'vitest';
import { memberText } from '#shared/text/member.ts';
import { todayText } from '#shared/text/today.ts';

it('says of a case that was recognised and then lost nothing that contradicts it', () => {
  // The server's word for a miss without a name is the same for both.
  expect(todayText.lostBy('not recognised', 'unrecognised')).toBe('not recognised');
  expect(todayText.lostBy('not recognised', 'lost')).not.toContain('not recognised');
  expect(todayText.lostBy('late', 'T')).toBe('time');
  expect(memberText.case.as('lost')).toBe('recognised, then lost');
  expect(memberText.case.as('unrecognised')).toBe('not recognised');
  expect(memberText.case.as('solved')).toBe('named solved');
  expect(memberText.case.as('Ja')).toBe('named Ja');
});
