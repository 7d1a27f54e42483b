import { describe, expect, it } from 'vitest';
import { boundTimes, type ClaimedTimes } from '#shared/memory/index.ts';

const claimed: ClaimedTimes = {
  issuedAt: 1_000_000,
  receivedAt: 1_010_000,
  claimedAnsweredAt: 1_008_000,
  recognitionMs: 2000,
  namingMs: 1000,
};

function bound(over: Partial<ClaimedTimes>) {
  return boundTimes({ ...claimed, ...over });
}

describe('times of an answer', () => {
  it('stand as claimed when they fit between issue and receipt', () => {
    expect(bound({})).toEqual({
      ok: true,
      answeredAt: 1_008_000,
      recognitionMs: 2000,
      namingMs: 1000,
      moved: false,
    });
  });

  it('move the moment of answering to what the server saw', () => {
    expect(bound({ claimedAnsweredAt: 2_000_000 })).toMatchObject({ answeredAt: 1_010_000, moved: true });
    expect(bound({ claimedAnsweredAt: 0 })).toMatchObject({ answeredAt: 1_003_000, moved: true });
  });

  it('accept an answer kept for days on a phone without reception', () => {
    const receivedAt = 1_000_000 + 5 * 86_400_000;
    expect(bound({ receivedAt })).toMatchObject({ ok: true, answeredAt: 1_008_000, moved: false });
  });

  it.each([-1, Number.NaN, Number.NEGATIVE_INFINITY])('refuse a recognition time of %s', (recognitionMs) => {
    expect(bound({ recognitionMs })).toEqual({ ok: false, reason: 'not a time' });
  });

  it('refuse times that are no numbers at all', () => {
    expect(bound({ claimedAnsweredAt: Number.NaN })).toEqual({ ok: false, reason: 'not a time' });
    expect(bound({ namingMs: -5 })).toEqual({ ok: false, reason: 'not a time' });
  });

  it('refuse a stopwatch that ran longer than the showing was out, but for a second of drift', () => {
    expect(bound({ recognitionMs: 9000 })).toMatchObject({ ok: true, answeredAt: 1_010_000 });
    expect(bound({ recognitionMs: 10_000 })).toMatchObject({ ok: true, answeredAt: 1_010_000, moved: true });
    expect(bound({ recognitionMs: 10_001 })).toEqual({
      ok: false,
      reason: 'longer than the showing was out',
    });
    expect(bound({ receivedAt: 900_000 })).toEqual({ ok: false, reason: 'longer than the showing was out' });
  });

  it('need no times where nothing was recognised', () => {
    expect(bound({ recognitionMs: null, namingMs: null })).toMatchObject({
      ok: true,
      recognitionMs: null,
      namingMs: null,
    });
  });
});
