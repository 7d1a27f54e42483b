import type { AssignSetInput, ProgrammeView } from '#shared/contracts/desk.ts';
import { defaultLimitMs } from '#shared/memory/grade-answer.ts';
import { deskText } from '#shared/text/desk.ts';

const text = deskText.programme;

/** What the form holds while it is filled in: texts as typed. */
export interface ProgrammeValues {
  readonly setKey: string;
  /** '' follows the newest. */
  readonly edition: string;
  readonly limit: string;
  readonly asksAuf: boolean;
  readonly forEveryone: boolean;
  readonly memberIds: readonly string[];
  readonly version: number;
}

export type ProgrammeField = 'set' | 'edition' | 'limit' | 'who' | 'members';

/** The form of a set that is on the programme. */
export function valuesOf(row: ProgrammeView['rows'][number]): ProgrammeValues {
  return {
    setKey: row.setKey,
    edition: row.pinnedEdition === null ? '' : String(row.pinnedEdition),
    limit: String(row.limitMs / 1000),
    asksAuf: row.asksAuf,
    forEveryone: row.forEveryone,
    memberIds: row.memberIds,
    version: row.version,
  };
}

/** The form of a set to be assigned: everyone, the newest edition, AUF asked, the usual limit of its size. */
export function valuesOfNew(set: ProgrammeView['available'][number]): ProgrammeValues {
  return {
    setKey: set.setKey,
    edition: '',
    limit: String(defaultLimitMs(set.cases) / 1000),
    asksAuf: true,
    forEveryone: true,
    memberIds: [],
    version: 0,
  };
}

/** Who answers, as chosen: from everyone to chosen members all are ticked, so that some can be taken out. */
export function choosing(
  values: ProgrammeValues,
  forEveryone: boolean,
  members: ProgrammeView['members'],
): ProgrammeValues {
  const all = values.forEveryone && !forEveryone;
  return {
    ...values,
    forEveryone,
    memberIds: all ? members.map(({ memberId }) => memberId) : values.memberIds,
  };
}

/** Checks the form as the server will: what to send, or what is wrong at which field. */
export function readValues(
  values: ProgrammeValues,
): { ok: true; input: AssignSetInput } | { ok: false; wrong: Partial<Record<ProgrammeField, string>> } {
  const wrong: Partial<Record<ProgrammeField, string>> = {};
  const typed = values.limit.trim().replace(',', '.');
  const limitMs = Math.round(Number(typed) * 1000);
  if (typed === '' || !Number.isFinite(limitMs)) wrong.limit = text.limitMissing;
  else if (limitMs < 500 || limitMs > 60_000) wrong.limit = text.limitOutside;
  if (!values.forEveryone && values.memberIds.length === 0) wrong.members = text.whoMissing;
  if (Object.keys(wrong).length > 0) return { ok: false, wrong };
  return {
    ok: true,
    input: {
      setKey: values.setKey,
      pinnedEdition: values.edition === '' ? null : Number(values.edition),
      limitMs,
      asksAuf: values.asksAuf,
      forEveryone: values.forEveryone,
      memberIds: values.forEveryone ? [] : [...values.memberIds],
      version: values.version,
    },
  };
}

/** Which field of the form a refusal of the server's speaks of. */
export function fieldOfPointer(pointer: string): ProgrammeField {
  if (pointer.startsWith('/limitMs')) return 'limit';
  if (pointer.startsWith('/pinnedEdition')) return 'edition';
  if (pointer.startsWith('/forEveryone')) return 'who';
  if (pointer.startsWith('/memberIds')) return 'members';
  return 'set';
}
