import { useParams } from 'react-router';
import { useCall } from '#renderer/api.ts';
import { Awaited } from '#renderer/awaited.tsx';
import { EmptyState, PageTitle, Section, TextLink } from '#renderer/ui/index.ts';
import type { MemberPageView } from '#shared/contracts/desk.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import { deskText } from '#shared/text/desk.ts';
import { sayPastDate } from '../say-figure.ts';
import { LatestAnswers } from './latest-answers.tsx';
import { Outcomes } from './outcomes.tsx';
import { SetTrend } from './set-trend.tsx';
import { WeakestCases } from './weakest-cases.tsx';

const text = deskText.member;

export function MemberPage() {
  const { memberId = '' } = useParams();
  const query = useCall(endpoints.memberPage, { memberId });
  return <Awaited query={query}>{(view) => <Member view={view} />}</Awaited>;
}

function Member({ view }: { view: MemberPageView }) {
  const trained =
    view.lastTrained === null
      ? text.neverTrained
      : text.lastTrained(sayPastDate(view.lastTrained, view.date));
  return (
    <>
      <p className="screen-only pt-2">
        <TextLink href="/desk/squad" className="inline-flex min-h-9 items-center">
          {text.back}
        </TextLink>
      </p>
      <PageTitle
        title={view.nickname}
        lead={view.role === 'captain' ? `${text.captain} ${trained}` : trained}
      />
      {view.sets.length === 0 ? (
        <EmptyState title={text.noSets}>
          <p>{text.noSetsLead}</p>
        </EmptyState>
      ) : (
        <div className="grid grid-cols-[minmax(0,1fr)] gap-x-14 gap-y-10 lg:grid-cols-2">
          {view.sets.map((set) => (
            <SetTrend key={set.setKey} set={set} date={view.date} />
          ))}
        </div>
      )}
      <div className="mt-10">
        <Outcomes rates={view.rates} />
      </div>
      <div className="mt-10 grid grid-cols-[minmax(0,1fr)] items-start gap-x-14 gap-y-10 xl:grid-cols-2">
        {view.cases.length > 0 && <WeakestCases cases={view.cases} />}
        <Section title={text.lately}>
          <LatestAnswers answers={view.lately} timeZone={view.timeZone} />
        </Section>
      </div>
    </>
  );
}
