import { Section } from '#renderer/ui/index.ts';
import type { LedgerView } from '#shared/contracts/ledger.ts';
import { ledgerText } from '#shared/text/ledger.ts';

const text = ledgerText.upTo;

/** How many cases are left when mirror images, and inverses, count as one. */
export function UpTo({ view }: { view: LedgerView }) {
  const { cases, upToMirror, upToInverse, upToMirrorAndInverse } = view;
  const rows = [
    { value: cases, label: text.cases },
    { value: upToMirror, label: text.mirror },
    { value: upToInverse, label: text.inverse },
    { value: upToMirrorAndInverse, label: text.both },
  ];
  return (
    <Section title={text.title} className="min-w-0">
      <dl className="rule-t">
        {rows.map(({ value, label }) => (
          <div
            key={label}
            className="flex flex-row-reverse items-baseline justify-end gap-4 border-b border-hair py-2"
          >
            <dt className="text-ink-2">{label}</dt>
            <dd className="min-w-20 text-end text-xl font-bold">
              {value === null ? text.none : ledgerText.whole(value)}
            </dd>
          </div>
        ))}
      </dl>
      {upToInverse === null && (
        <p className="mt-3 max-w-[34rem] text-[0.9375rem] text-ink-2">{text.undefinedHere}</p>
      )}
    </Section>
  );
}
