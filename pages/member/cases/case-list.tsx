import { AlgorithmText, AppLink, FlatView } from '#renderer/ui/index.ts';
import type { MyCase } from '#shared/contracts/member.ts';
import { memberText } from '#shared/text/member.ts';
import { caseHref } from '../case-href.ts';
import { sayDate } from '../say-date.ts';
import { StateMark } from '../state-mark.tsx';

const text = memberText.cases;

/** Cases on a narrow screen: one under the other, each a link to its page. */
export function CaseList({ cases, today }: { cases: readonly MyCase[]; today: string }) {
  return (
    <ul className="rule-t">
      {cases.map((c) => (
        <li key={c.key} className="border-b border-hair">
          <AppLink href={caseHref(c.key)} className="flex gap-4 py-3">
            <FlatView
              stickers={c.picture.stickers}
              colouring={c.picture.colouring}
              className="w-16 shrink-0 self-start"
            />
            <span className="min-w-0 flex-1">
              <span className="flex flex-wrap items-baseline justify-between gap-x-3">
                <span>
                  <span className="text-ink-2">{c.setName}</span> <b className="text-lg">{c.name}</b>
                  {c.tradeName && <span className="ms-2 text-ink-2">{c.tradeName}</span>}
                  {c.group && <span className="ms-2 text-[0.9375rem] text-ink-2">{c.group}</span>}
                </span>
                <span className="text-[0.9375rem] text-ink-2">
                  {memberText.prior(c.prior.weight, c.prior.total)}
                </span>
              </span>
              <AlgorithmText text={c.algorithm} className="block leading-snug" />
              <span className="mt-1 flex flex-wrap items-baseline gap-x-4 text-[0.9375rem]">
                <StateMark state={c.state} />
                {c.recall !== null && <span>{text.recallNow(c.recall)}</span>}
                {c.nextDate !== null && (
                  <span className="text-ink-2">{text.next(sayDate(c.nextDate, today))}</span>
                )}
              </span>
            </span>
          </AppLink>
        </li>
      ))}
    </ul>
  );
}
