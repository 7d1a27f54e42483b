import type { FormView } from '#shared/contracts/member.ts';
import { memberText } from '#shared/text/member.ts';
import { StateMark } from '../state-mark.tsx';

type States = FormView['sets'][number]['states'];

const ORDER = ['holding', 'slipping', 'settling', 'unmet'] as const;

/** How many cases of a set are in each state. */
export function StatesBar({ states }: { states: States }) {
  return (
    <dl aria-label={memberText.form.states} className="flex flex-wrap gap-x-6 gap-y-1 py-3 text-[0.9375rem]">
      {ORDER.map((state) => (
        <div key={state} className="flex items-baseline gap-2">
          <dt className="order-2">
            <StateMark state={state} />
          </dt>
          <dd className="order-1 font-bold">{states[state]}</dd>
        </div>
      ))}
    </dl>
  );
}
