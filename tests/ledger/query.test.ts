import { describe, expect, it } from 'vitest';
import { casesHref, casesInputOf } from '#pages/ledger/cases/cases-query.ts';
import { doneOn } from '#pages/ledger/done.ts';
import { ledgerHref, readLedgerQuery } from '#pages/ledger/ledger-query.ts';
import { ledgerCasesInput, ledgerInput } from '#shared/contracts/ledger.ts';
import { ASPECTS, EVERY_ENTRY, fixedBy } from '#shared/lastlayer/index.ts';
import { ledgerText } from '#shared/text/ledger.ts';

const read = (query: string) => readLedgerQuery(new URLSearchParams(query));
const fields = (query: string) => read(query).errors.map(({ fieldId }) => fieldId);

describe('the form in an address', () => {
  it('begins with PLL', () => {
    expect(read('')).toMatchObject({ input: { entry: 'co+eo', aspects: ['cp', 'ep'] }, errors: [] });
  });

  it('is read as a form sends it, as a link of ours has it, and as somebody types it', () => {
    const wanted = { entry: 'co+eo', aspects: ['cp', 'ep'] };
    for (const query of [
      'entry=co%2Beo&aspects=cp&aspects=ep&with=&share=40',
      'entry=co%2Beo&aspects=cp,ep',
      'entry=co+eo&aspects=ep, cp',
    ]) {
      expect(read(query).input).toEqual(wanted);
    }
    expect(read('entry=eo&aspects=').input).toEqual({ entry: 'eo', aspects: [] });
    expect(read('entry=any&aspects=co&with=eo&share=40').input).toMatchObject({ with: 'eo', share: 40 });
  });

  it('says what is wrong with which field, and counts what can be counted', () => {
    expect(fields('entry=&aspects=cp')).toEqual(['entry']);
    expect(fields('entry=all&aspects=cp,xx,yy')).toEqual(['entry', 'aspects', 'aspects']);
    expect(read('entry=all&aspects=cp').input).toBeNull();
    expect(read('entry=all&aspects=cp').asked.aspects).toEqual(['cp']);
    for (const [mix, field] of [
      ['with=eo&share=0', 'share'],
      ['with=eo&share=100', 'share'],
      ['with=eo&share=ten', 'share'],
      ['with=eo&share=33.3', 'share'],
      ['with=eo&share=7,5', 'share'],
      ['with=eo&share=-5', 'share'],
      ['with=nothing&share=40', 'with'],
      ['with=any&share=40', 'with'],
    ]) {
      const { errors, input } = read(`entry=any&aspects=co&${mix}`);
      expect(errors.map(({ fieldId }) => fieldId)).toEqual([field]);
      expect(input).toEqual({ entry: 'any', aspects: ['co'] });
    }
  });

  it('comes back as it was, and the server takes whatever is asked of it', () => {
    for (const entry of EVERY_ENTRY) {
      for (const aspects of [[], ['co'], [...ASPECTS]] as const) {
        const asked = { entry, aspects: [...aspects], with: null, share: '40' };
        const { input, asked: back } = read(ledgerHref(asked).split('?')[1] ?? '');
        expect(back).toEqual(asked);
        expect(ledgerInput.parse(input)).toEqual(input);
      }
    }
    const mix = { entry: 'any', aspects: ['co'], with: 'cp+eo', share: '7' } as const;
    const { input, asked } = read(ledgerHref(mix).split('?')[1] ?? '');
    expect(asked).toEqual(mix);
    expect(ledgerInput.parse(input)).toMatchObject({ with: 'cp+eo', share: 7 });
  });

  it('has the entry conditions of the engine, each with what it has done', () => {
    expect(Object.keys(ledgerText.entries)).toEqual(EVERY_ENTRY);
    for (const entry of EVERY_ENTRY) expect([...doneOn(entry)].sort()).toEqual([...fixedBy(entry)].sort());
  });
});

describe('the list in an address', () => {
  it('comes back as it was, and what it does not know is left out', () => {
    const step = { entry: 'co+eo', aspects: ['cp', 'ep'] } as const;
    const chosen = {
      angles: 4,
      group: 'adjacent corners',
      sort: 'prior',
      order: 'descending',
      page: 3,
      size: 'most',
    } as const;
    const input = casesInputOf(new URLSearchParams(casesHref(step, chosen).split('?')[1]));
    expect(input).toEqual({ ...step, ...chosen });
    expect(ledgerCasesInput.parse(input)).toEqual(input);
    expect(
      casesInputOf(new URLSearchParams('entry=any&aspects=co&angles=3&sort=x&page=-1&order=up&size=all')),
    ).toEqual({
      entry: 'any',
      aspects: ['co'],
    });
    expect(casesInputOf(new URLSearchParams('entry=nothing'))).toBeNull();
  });
});
