import { useEffect } from 'react';
import { useParams } from 'react-router';
import { useCall } from '#renderer/api.ts';
import { Awaited } from '#renderer/awaited.tsx';
import {
  AlgorithmText,
  AppLink,
  BigNumber,
  BigNumbers,
  FlatView,
  SeatView,
  Section,
  TextLink,
} from '#renderer/ui/index.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import type { MyCaseView } from '#shared/contracts/member.ts';
import { aufText } from '#shared/text/auf.ts';
import { memberText } from '#shared/text/member.ts';
import { shellText } from '#shared/text/shell.ts';
import { caseHref } from '../case-href.ts';
import { sayDate } from '../say-date.ts';
import { MemberScreen } from '../screen.tsx';
import { StateMark } from '../state-mark.tsx';
import { LatestAnswers } from './latest-answers.tsx';

const text = memberText.case;

/** One case: all its angles side by side, its algorithms and mirror partner, and how it went lately. */
export function CasePage() {
  const { key = '' } = useParams();
  const query = useCall(endpoints.myCase, { key });
  const title = query.data ? `${query.data.case.setName} ${query.data.case.name}` : text.title;
  useEffect(() => {
    document.title = `${title} · ${shellText.product}`;
  }, [title]);
  return (
    <MemberScreen title={title} aside={<TextLink href="/cases">{text.back}</TextLink>}>
      <Awaited query={query} missing={text.missing}>
        {(view) => <CaseContent view={view} />}
      </Awaited>
    </MemberScreen>
  );
}

function CaseContent({ view }: { view: MyCaseView }) {
  const c = view.case;
  const { weight, total } = c.prior;
  return (
    <div className="flex flex-col gap-8 pt-5">
      <BigNumbers>
        <BigNumber
          value={memberText.prior(weight, total)}
          label={`${text.prior} (${memberText.priorExact(weight, total)})`}
        />
        {c.recall !== null && <BigNumber value={memberText.percent(c.recall)} label={text.recall} />}
        {c.nextDate !== null && <BigNumber value={sayDate(c.nextDate, view.date)} label={text.next} />}
      </BigNumbers>
      <p className="flex flex-wrap items-baseline gap-x-6 gap-y-1">
        <StateMark state={c.state} />
        {c.tradeName && (
          <span>
            <span className="text-ink-2">{text.tradeName}</span> {c.tradeName}
          </span>
        )}
        {c.group && (
          <span>
            <span className="text-ink-2">{text.group}</span> {c.group}
          </span>
        )}
        <span className="text-ink-2">{memberText.answers(c.answers)}</span>
        <TextLink
          href={`/catalogue/${c.setKey}/cases/${encodeURIComponent(c.key)}`}
          className="inline-flex min-h-12 items-center"
        >
          {text.inCatalogue}
        </TextLink>
      </p>
      <Section title={text.angles}>
        <p className="pb-3 text-ink-2">{text.anglesNote(view.angles.length)}</p>
        <ul className="grid grid-cols-2 gap-4 sm:grid-cols-4">
          {view.angles.map((angle, turns) => (
            <li key={`${angle.stickers.top} ${angle.stickers.front} ${angle.stickers.right}`}>
              <SeatView stickers={angle.stickers} colouring={angle.colouring} holding="right" />
              <p className="pt-1 text-center text-[0.9375rem] text-ink-2">
                {text.angle(aufText.name((4 - turns) % 4))}
              </p>
            </li>
          ))}
        </ul>
      </Section>
      <Section title={text.algorithms}>
        <ul className="divide-y divide-hair border-t border-hair">
          {view.algorithms.map(({ algorithm, note }) => (
            <li key={algorithm} className="py-2">
              <AlgorithmText text={algorithm} className="text-lg" />
              {note && <span className="ms-3 text-[0.9375rem] text-ink-2">{note}</span>}
            </li>
          ))}
        </ul>
      </Section>
      <Section title={text.mirror}>
        {view.mirror ? (
          <AppLink
            href={caseHref(view.mirror.key)}
            className="inline-flex items-center gap-4 hover:underline"
          >
            <FlatView
              stickers={view.mirror.picture.stickers}
              colouring={view.mirror.picture.colouring}
              className="w-16"
            />
            <span className="text-xl font-bold">{view.mirror.name}</span>
          </AppLink>
        ) : (
          <p className="text-ink-2">{text.mirrorSelf}</p>
        )}
      </Section>
      <Section title={text.latest}>
        <LatestAnswers answers={view.answers} />
      </Section>
    </div>
  );
}
