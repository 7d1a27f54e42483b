import { and, asc, eq, isNull, or, sql } from 'drizzle-orm';
import { type Transaction, tables } from '#database/client.ts';
import type { EntryPart, PreviewSetInput } from '#shared/contracts/case-sets.ts';
import {
  type Aspect,
  buildCaseSet,
  type CaseSet,
  inOrder,
  isAspect,
  isEntry,
  meetOf,
  requireDefinition,
} from '#shared/lastlayer/index.ts';
import { caseSetText } from '#shared/text/case-sets.ts';
import { Problem } from '../../http/problem.ts';
import type { Definer } from './as-definer.ts';

export interface Structure {
  readonly entries: readonly EntryPart[];
  readonly toldApart: readonly Aspect[];
  readonly solved: readonly Aspect[];
}

/** A definition as it stands in an address. @throws Problem invalid for a word that is no entry or aspect. */
export function structureOfWords({ entries, toldApart, solved }: PreviewSetInput): Structure {
  return {
    entries: words(entries).map((word) => {
      const [entry = '', parts = '1'] = word.split(':');
      if (!isEntry(entry)) throw unknown('/entries', entry);
      return { entry, parts: Number(parts) };
    }),
    toldApart: aspectsOf('/toldApart', toldApart),
    solved: aspectsOf('/solved', solved),
  };
}

const words = (list: string): string[] => list.split(',').filter(Boolean);

function aspectsOf(pointer: string, list: string): Aspect[] {
  return words(list).map((word) => {
    if (!isAspect(word)) throw unknown(pointer, word);
    return word;
  });
}

function unknown(pointer: string, word: string): Problem {
  const detail = `“${word}” is not known here.`;
  return new Problem('invalid', detail, { errors: [{ pointer, detail }] });
}

/**
 * The set that a definition makes; several entries are a mix.
 * @throws RangeError in a sentence for whoever defines it.
 */
export function buildDefinition(
  { key, name }: { key: string; name: string },
  { entries, toldApart, solved }: Structure,
): CaseSet {
  const definition = {
    key,
    name,
    entry: meetOf(entries.map(({ entry }) => entry)),
    mix: entries.length > 1 ? entries : [],
    toldApart: inOrder(toldApart),
    solved: inOrder(solved),
  };
  // A sentence that began with a name of somebody's choice could be read in any way.
  requireDefinition({ ...definition, name: caseSetText.problems.thisSet });
  return buildCaseSet(definition);
}

/**
 * The standing set, everyone's or of the definer's club, that has the keys of this one's cases and editions of its
 * own: the very same set, or for a mix the one whose algorithms serve it.
 */
export async function setWithSameCases(
  tx: Transaction,
  { clubId }: Definer,
  { skip }: CaseSet,
): Promise<{ setKey: string; name: string } | null> {
  const { caseSet, setCase } = tables;
  const [found] = await tx
    .select({ setKey: caseSet.setKey, name: caseSet.name })
    .from(setCase)
    .innerJoin(caseSet, eq(caseSet.setKey, setCase.setKey))
    .where(
      and(
        eq(setCase.caseKey, skip.key),
        eq(setCase.isSkip, true),
        isNull(caseSet.parentKey),
        isNull(caseSet.retiredAt),
        // An administrator sees the sets of clubs too, but none of them serves everyone.
        clubId === null ? isNull(caseSet.clubId) : or(isNull(caseSet.clubId), eq(caseSet.clubId, clubId)),
        eq(sql`jsonb_array_length(${caseSet.mix})`, 0),
      ),
    )
    // The installation's before a club's own.
    .orderBy(sql`${caseSet.clubId} is not null`, asc(caseSet.createdAt))
    .limit(1);
  return found ?? null;
}
