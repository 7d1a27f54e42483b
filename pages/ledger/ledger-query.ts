import type { FieldError } from '#renderer/ui/index.ts';
import type { LedgerInput } from '#shared/contracts/ledger.ts';
import type { Aspect, Entry } from '#shared/lastlayer/index.ts';
import { ledgerText } from '#shared/text/ledger.ts';

const { form, problems } = ledgerText;

/** Ids of the form's fields: error summaries lead to them. */
export const FIELDS = { entry: 'entry', aspects: 'aspects', with: 'with', share: 'share' } as const;

/** Shown before anything has been asked for. */
const FIRST: Step = { entry: 'co+eo', aspects: ['cp', 'ep'] };
/** In the field until somebody types another. */
const FIRST_SHARE = '40';

export interface Step {
  readonly entry: Entry;
  readonly aspects: readonly Aspect[];
}

/** The form as it stands in an address. */
export interface LedgerForm extends Step {
  readonly with: Entry | null;
  /** As typed. */
  readonly share: string;
}

export interface ReadLedger {
  readonly asked: LedgerForm;
  /** What to ask the server for: the mix is left out while it is not right; null where the step itself is not. */
  readonly input: LedgerInput | null;
  readonly errors: readonly FieldError[];
}

const isEntry = (word: string): word is Entry => Object.hasOwn(ledgerText.entries, word);
const ALL_ASPECTS = Object.keys(ledgerText.aspects) as Aspect[];

/** A plus typed into an address by hand reaches us as a space. */
const entryWord = (query: URLSearchParams, name: string): string =>
  (query.get(name) ?? '').trim().replaceAll(' ', '+');

/** Step of an address: entry, and aspects as a list or one by one. What is not right is told and left out. */
export function readStep(query: URLSearchParams): { step: Step; errors: FieldError[] } {
  if (!query.has('entry') && !query.has('aspects')) return { step: FIRST, errors: [] };
  const errors: FieldError[] = [];
  const entry = entryWord(query, 'entry');
  if (!isEntry(entry)) {
    const message = entry === '' ? form.entryMissing : form.asked(form.entry, entry);
    errors.push({ fieldId: FIELDS.entry, message });
  }
  const words = query
    .getAll('aspects')
    .flatMap((list) => list.split(','))
    .map((word) => word.trim())
    .filter((word) => word !== '');
  for (const word of words.filter((one) => !ALL_ASPECTS.some((aspect) => aspect === one))) {
    errors.push({ fieldId: FIELDS.aspects, message: form.asked(form.aspects, word) });
  }
  return {
    step: {
      entry: isEntry(entry) ? entry : FIRST.entry,
      aspects: ALL_ASPECTS.filter((aspect) => words.includes(aspect)),
    },
    errors,
  };
}

/** A share in per cent, from 1 to 99, or null. */
export function shareOf(typed: string): number | null {
  const share = /^\d{1,2}$/.test(typed.trim()) ? Number(typed) : 0;
  return share >= 1 ? share : null;
}

/** The whole form of an address, what is wrong in it, and what to ask the server for. */
export function readLedgerQuery(query: URLSearchParams): ReadLedger {
  const { step, errors } = readStep(query);
  const second = entryWord(query, 'with');
  const asked: LedgerForm = {
    ...step,
    with: isEntry(second) ? second : null,
    share: query.get('share')?.trim() || FIRST_SHARE,
  };
  if (errors.length > 0) return { asked, input: null, errors };

  if (second === '') return { asked, input: { ...step }, errors };
  const share = shareOf(asked.share);
  if (asked.with === null) errors.push({ fieldId: FIELDS.with, message: form.asked(form.with, second) });
  else if (asked.with === step.entry) errors.push({ fieldId: FIELDS.with, message: problems.mixSame });
  if (share === null) errors.push({ fieldId: FIELDS.share, message: problems.share });
  const mix = errors.length === 0 && asked.with !== null && share !== null ? { with: asked.with, share } : {};
  return { asked, input: { ...step, ...mix }, errors };
}

/** The step as a query: `entry=co%2Beo&aspects=cp,ep`. */
export function stepQuery({ entry, aspects }: Step): string {
  return `entry=${encodeURIComponent(entry)}&aspects=${aspects.join(',')}`;
}

/** The address of a form as filled in. */
export function ledgerHref({ with: second, share, ...step }: LedgerForm): string {
  const mix = second === null ? '' : `&with=${encodeURIComponent(second)}&share=${encodeURIComponent(share)}`;
  return `/ledger?${stepQuery(step)}${mix}`;
}
