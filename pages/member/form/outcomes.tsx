import { BigNumber, BigNumbers } from '#renderer/ui/index.ts';
import type { FormView } from '#shared/contracts/member.ts';
import { memberText } from '#shared/text/member.ts';

/** Held, late, missed and left of the last 28 days, with mis-taps beside. */
export function Outcomes({ outcomes }: { outcomes: FormView['outcomes'] }) {
  const { held, late, missed, left, misTaps } = outcomes;
  const scored = held + late + missed;
  if (scored + left === 0) return <p className="text-ink-2">{memberText.form.noOutcomes}</p>;
  const share = (count: number) => (scored > 0 ? ` ${memberText.percent(count / scored)}` : '');
  return (
    <BigNumbers>
      <BigNumber value={String(held)} label={memberText.outcomes.held + share(held)} />
      <BigNumber value={String(late)} label={memberText.outcomes.late + share(late)} />
      <BigNumber
        value={String(missed)}
        label={memberText.outcomes.missed + share(missed)}
        tone={missed > 0 ? 'rose' : 'quiet'}
      />
      <BigNumber value={String(left)} label={memberText.outcomes.left} tone="quiet" />
      <BigNumber value={String(misTaps)} label={memberText.form.misTaps} tone="quiet" />
    </BigNumbers>
  );
}
