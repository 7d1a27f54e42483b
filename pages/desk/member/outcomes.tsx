import { BigNumber, BigNumbers, Section } from '#renderer/ui/index.ts';
import type { MemberPageView } from '#shared/contracts/desk.ts';
import { deskText } from '#shared/text/desk.ts';
import { numberText } from '#shared/text/numbers.ts';

const text = deskText.member;

/** What became of a member's showings: shares of the answers, and of all showings for those left. */
export function Outcomes({ rates }: { rates: MemberPageView['rates'] }) {
  const { answers, held, late, missed, left, misTaps } = rates;
  return (
    <Section title={text.outcomes} ruled>
      {answers + left === 0 ? (
        <p className="py-3 text-ink-2">{text.noAnswers}</p>
      ) : (
        <div className="pt-4">
          <BigNumbers>
            <Rate label={text.rates.held} of={held} all={answers} />
            <Rate label={text.rates.late} of={late} all={answers} />
            <Rate label={text.rates.missed} of={missed} all={answers} />
            <Rate label={text.rates.left} of={left} all={answers + left} />
            <Rate label={text.rates.misTaps} of={misTaps} all={answers} />
          </BigNumbers>
        </div>
      )}
    </Section>
  );
}

function Rate({ label, of, all }: { label: string; of: number; all: number }) {
  return (
    <BigNumber
      value={all === 0 ? deskText.none : numberText.percent(of / all, of > 0 && of / all < 0.1 ? 1 : 0)}
      label={text.rateOf(label, of, all)}
    />
  );
}
