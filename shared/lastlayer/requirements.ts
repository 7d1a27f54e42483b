/** Which sets can be: refusals in the words of someone who defines one. */
import { ASPECTS, type Aspect, EVERY_ENTRY, fixedBy, seenThrough } from './aspects.ts';
import { MOST_PARTS, meetOf } from './mix.ts';
import { type CaseSetDefinition, openIn } from './sets.ts';

const NAMES: Readonly<Record<Aspect, string>> = {
  co: 'corner orientation',
  eo: 'edge orientation',
  cp: 'corner permutation',
  ep: 'edge permutation',
};
const known = (aspect: Aspect): boolean => ASPECTS.includes(aspect);

function requireWords({ key, name, entry, toldApart, solved, mix }: CaseSetDefinition): void {
  if (!/^[a-z0-9][a-z0-9-]{0,59}$/u.test(key))
    throw new RangeError(`The key "${key}" is not 1 to 60 small letters, digits and hyphens.`);
  if (name.trim() === '') throw new RangeError('The set has no name.');
  const unknown = [...toldApart, ...solved].find((aspect) => !known(aspect));
  if (unknown !== undefined) throw new RangeError(`There is no aspect "${unknown}".`);
  const missing = [entry, ...mix.map((share) => share.entry)].find((one) => !EVERY_ENTRY.includes(one));
  if (missing !== undefined) throw new RangeError(`There is no entry condition "${missing}".`);
}

function requireMix({ name, entry, mix }: CaseSetDefinition): void {
  if (mix.length === 0) return;
  const entries = mix.map((share) => share.entry);
  if (entries.length < 2 || new Set(entries).size < entries.length)
    throw new RangeError(`${name} is a mix: it needs two or more entries, each of them once.`);
  const wrong = mix.find(({ parts }) => !Number.isInteger(parts) || parts < 1 || parts > MOST_PARTS);
  if (wrong)
    throw new RangeError(`The share of "${wrong.entry}" is not a whole number from 1 to ${MOST_PARTS}.`);
  if (meetOf(entries) !== entry)
    throw new RangeError(`The entries of ${name} have "${meetOf(entries)}" in common, not "${entry}".`);
}

/** An algorithm must be one case's: what it finishes is seen, and what is seen besides is finished. */
function requireSolvable(set: CaseSetDefinition): void {
  const { name, entry, toldApart, solved } = set;
  const unseen = solved.find((aspect) => !seenThrough(entry, toldApart).includes(aspect));
  if (unseen)
    throw new RangeError(`${name} solves ${NAMES[unseen]}, which is neither told apart nor done on arrival.`);
  const unsolved = toldApart.find((aspect) => !solved.includes(aspect));
  if (unsolved) throw new RangeError(`${name} tells ${NAMES[unsolved]} apart but does not solve it.`);
  const open = openIn(set);
  if (open.length === 0) throw new RangeError(`${name} tells nothing apart that is not done on arrival.`);
  for (const [one, other] of [
    ['cp', 'ep'],
    ['ep', 'cp'],
  ] as const)
    if (open.includes(one) && fixedBy(entry).includes(other) && !solved.includes(other))
      throw new RangeError(
        `${name} tells ${NAMES[one]} apart against ${NAMES[other]}, which is done on arrival: it must solve both.`,
      );
}

/**
 * Refuses a definition that names what there is not, a mix whose entries or parts are wrong, and a set whose
 * algorithms could not be said to solve one case of it.
 * @throws RangeError in one sentence.
 */
export function requireDefinition(set: CaseSetDefinition): void {
  requireWords(set);
  requireMix(set);
  requireSolvable(set);
}
