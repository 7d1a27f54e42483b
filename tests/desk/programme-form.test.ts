import { describe, expect, it } from 'vitest';
import {
  choosing,
  fieldOfPointer,
  type ProgrammeValues,
  readValues,
  valuesOf,
  valuesOfNew,
} from '#pages/desk/programme/programme-form-values.ts';
import { assignSetInput } from '#shared/contracts/desk.ts';

const typed: ProgrammeValues = {
  setKey: 'pll',
  edition: '',
  limit: '3',
  asksAuf: true,
  forEveryone: true,
  memberIds: [],
  version: 0,
};
const somebody = '0193d1a0-0000-7000-8000-000000000001';

describe('the programme’s form', () => {
  it('starts a set with the usual limit of its size', () => {
    const set = (cases: number) => ({ setKey: 'x', name: 'X', editions: [1], cases });
    // 3 s for PLL (21) and OLL (57), 6 s for larger sets (ZBLL, 472): the product's defaults.
    expect(valuesOfNew(set(21)).limit).toBe('3');
    expect(valuesOfNew(set(57)).limit).toBe('3');
    expect(valuesOfNew(set(472)).limit).toBe('6');
    expect(valuesOfNew(set(21))).toMatchObject({ edition: '', asksAuf: true, forEveryone: true, version: 0 });
  });

  it('sends what the server’s contract takes', () => {
    const read = readValues({
      ...typed,
      limit: ' 2,5 ',
      edition: '4',
      forEveryone: false,
      memberIds: [somebody],
    });
    if (!read.ok) throw new Error('This form is whole.');
    expect(assignSetInput.parse(read.input)).toEqual({
      setKey: 'pll',
      pinnedEdition: 4,
      limitMs: 2500,
      asksAuf: true,
      forEveryone: false,
      memberIds: [somebody],
      version: 0,
    });
    expect(readValues({ ...typed, memberIds: [somebody] })).toMatchObject({
      ok: true,
      input: { memberIds: [] },
    });
  });

  it('says at which field it is not whole', () => {
    const wrong = (part: Partial<ProgrammeValues>) => {
      const read = readValues({ ...typed, ...part });
      return read.ok ? [] : Object.keys(read.wrong);
    };
    for (const limit of ['', 'fast', '0.4', '61', '-3', 'Infinity'])
      expect(wrong({ limit }), limit).toEqual(['limit']);
    expect(wrong({ forEveryone: false })).toEqual(['members']);
    expect(wrong({ limit: 'x', forEveryone: false })).toEqual(['limit', 'members']);
    for (const limit of ['0.5', '60']) expect(wrong({ limit }), limit).toEqual([]);
  });

  it('starts choosing members from everyone, and keeps a choice that was made', () => {
    const members = [
      { memberId: somebody, nickname: 'Ines' },
      { memberId: '0193d1a0-0000-7000-8000-000000000002', nickname: 'Kofi' },
    ];
    const all = choosing(typed, false, members);
    expect(all).toMatchObject({ forEveryone: false, memberIds: members.map(({ memberId }) => memberId) });
    const one = { ...all, memberIds: [somebody] };
    expect(choosing(one, false, members)).toEqual(one);
  });

  it('shows a row as it stands, and the server’s refusals at their fields', () => {
    const row = {
      ...{ setKey: 'pll', name: 'PLL', pinnedEdition: 2, newestEdition: 3, limitMs: 2500 },
      ...{ asksAuf: false, forEveryone: true, memberIds: [], version: 7 },
    };
    expect(valuesOf(row)).toMatchObject({ edition: '2', limit: '2.5', asksAuf: false, version: 7 });
    expect(
      ['/limitMs', '/pinnedEdition', '/forEveryone', '/memberIds/0', '/setKey'].map(fieldOfPointer),
    ).toEqual(['limit', 'edition', 'who', 'members', 'set']);
  });
});
