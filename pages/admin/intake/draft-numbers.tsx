import { BigNumber, BigNumbers } from '#renderer/ui/index.ts';
import type { DraftView } from '#shared/contracts/intake.ts';
import { intakeText } from '#shared/text/intake.ts';

const text = intakeText.draft.numbers;

/** How many lines, what they cover, what stands in the way. */
export function DraftNumbers({ view }: { view: DraftView }) {
  const { draft, covered, of, missing, newestEdition, cannot, toDecide, lines } = view;
  const dropped = lines.filter(({ standing }) => standing === 'out').length;
  const rest = newestEdition === null ? text.without(missing) : text.stay(missing, newestEdition);
  return (
    <BigNumbers>
      <BigNumber tone="quiet" value={intakeText.grouped(draft.lines)} label={text.lines(draft.lines)} />
      <BigNumber
        tone="quiet"
        value={text.covered(covered, of)}
        label={`${text.coveredLabel}${draft.state === 'open' ? rest : ''}`}
      />
      {draft.state === 'open' && (
        <>
          <BigNumber
            tone={cannot > 0 ? 'rose' : 'quiet'}
            value={intakeText.grouped(cannot)}
            label={text.cannot}
          />
          <BigNumber
            tone={toDecide > 0 ? 'ochre' : 'quiet'}
            value={intakeText.grouped(toDecide)}
            label={text.decide}
          />
        </>
      )}
      {dropped > 0 && <BigNumber tone="quiet" value={intakeText.grouped(dropped)} label={text.dropped} />}
    </BigNumbers>
  );
}
