import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import { MixPart } from '#pages/ledger/mix-part.tsx';
import { readLedger } from '#server/services/ledger/read-ledger.ts';
import type { Entry } from '#shared/lastlayer/index.ts';
import { ledgerText } from '#shared/text/ledger.ts';

const step = { entry: 'any', aspects: ['co', 'eo'] } as const;
const counted = await readLedger(undefined as never, { ...step, with: 'eo', share: 40 });

/** The part as it stands when this is in its fields and the last figures are those of 40 per cent. */
const part = (share: string, second: Entry | null = 'eo', atOnce = true) =>
  renderToStaticMarkup(
    <MixPart
      view={second === null ? { ...counted, mix: null } : counted}
      asked={{ ...step, with: second, share }}
      errorOf={() => undefined}
      form="form"
      atOnce={atOnce}
      onChange={() => {}}
    />,
  );

describe('the share of a mix', () => {
  it('is kept as typed, told where it is none, and has no figures then', () => {
    for (const wrong of ['0', '100', '33.3', '7,5', 'ab', '-5']) {
      const html = part(wrong);
      expect(html).toContain(`value="${wrong}"`);
      expect(html).toContain(ledgerText.problems.share);
      expect(html).not.toContain('<table');
    }
    for (const right of ['1', '40', '99']) {
      expect(part(right)).not.toContain(ledgerText.problems.share);
      expect(part(right)).toContain('<table');
    }
  });

  it('is not asked for while there is no mix, unless nothing would wake the field', () => {
    expect(part('40', null)).toMatch(/<input[^>]*disabled=""/);
    expect(part('0', null)).not.toContain(ledgerText.problems.share);
    expect(part('40')).not.toContain('disabled=""');
    expect(part('40', null, false)).not.toContain('disabled=""');
  });
});
