import { useCall } from '#renderer/api.ts';
import { Awaited } from '#renderer/awaited.tsx';
import { EmptyState, FigureBar, Section } from '#renderer/ui/index.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import type { FormView } from '#shared/contracts/member.ts';
import { memberText } from '#shared/text/member.ts';
import { MemberScreen } from '../screen.tsx';
import { MinutesChart } from './minutes-chart.tsx';
import { Outcomes } from './outcomes.tsx';
import { RecallTrend } from './recall-trend.tsx';
import { StatesBar } from './states-bar.tsx';

const text = memberText.form;

/** Form: what the figures say of the member, no more. */
export function FormPage() {
  const query = useCall(endpoints.form, {});
  return (
    <MemberScreen title={text.title}>
      <Awaited query={query}>
        {(view) => (
          <div className="flex flex-col gap-10 pt-5">
            {view.sets.length === 0 ? (
              <EmptyState title={memberText.noSets.title}>
                <p>{memberText.noSets.detail}</p>
              </EmptyState>
            ) : (
              <Section title={text.recall}>
                <p className="max-w-[38rem] pb-4 text-[0.9375rem] text-ink-2">{text.recallNote}</p>
                <div className="flex flex-col gap-10">
                  {view.sets.map((set) => (
                    <SetForm key={set.setKey} set={set} />
                  ))}
                </div>
              </Section>
            )}
            <Section title={text.outcomes}>
              <Outcomes outcomes={view.outcomes} />
            </Section>
            <Section title={text.minutes}>
              <MinutesChart days={view.minutesPerDay} />
            </Section>
          </div>
        )}
      </Awaited>
    </MemberScreen>
  );
}

function SetForm({ set }: { set: FormView['sets'][number] }) {
  const { name, edition, now, days, states } = set;
  return (
    <article aria-label={name}>
      <div className="grid grid-cols-[1fr_10rem] items-end gap-4 sm:grid-cols-[1fr_16rem]">
        <h3 className="text-xl font-bold">
          {name}
          <span className="ms-3 text-[0.9375rem] font-normal text-ink-2">{text.edition(edition)}</span>
        </h3>
        <div>
          <p className="text-end text-[2.125rem] font-bold leading-none" aria-hidden="true">
            {memberText.figure(now)}
          </p>
          <FigureBar
            figure={now.rests === 'nothing' ? null : now}
            text={memberText.figure(now)}
            label={memberText.figureLabel(now)}
            hollow={now.few}
            bare
          />
        </div>
      </div>
      <StatesBar states={states} />
      <RecallTrend name={name} days={days} />
    </article>
  );
}
