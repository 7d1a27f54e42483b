import { type Column, DataTable } from '#renderer/ui/index.ts';
import type { MyCaseView } from '#shared/contracts/member.ts';
import { memberText } from '#shared/text/member.ts';
import { todayText } from '#shared/text/today.ts';
import { useLocalTime } from '../use-local-time.ts';

type Answer = MyCaseView['answers'][number];

const text = memberText.case;
/** The right name under a wrong AUF: then the name says nothing. */
const AUF_ONLY = 'AUF before';

/** The last answers to a case, newest first. */
export function LatestAnswers({ answers }: { answers: MyCaseView['answers'] }) {
  const say = useLocalTime();
  if (answers.length === 0) return <p className="text-ink-2">{text.noAnswers}</p>;
  const columns: Column<Answer>[] = [
    {
      key: 'when',
      header: text.columns.when,
      rowHeader: true,
      nowrap: true,
      cell: (a) => <time dateTime={new Date(a.at).toISOString()}>{say(a.at)}</time>,
    },
    {
      key: 'outcome',
      header: text.columns.outcome,
      cell: (a) => (
        <>
          <span className={a.outcome === 'missed' ? 'font-bold text-rose' : 'font-bold'}>
            {memberText.outcomes[a.outcome]}
          </span>
          {a.outcome === 'missed' && a.lostBy !== AUF_ONLY && (
            <span className="text-ink-2">, {memberText.case.as(a.named)}</span>
          )}
          {a.misTapped && <span className="text-ink-2">, {text.misTap}</span>}
          {!a.scored && a.outcome !== 'left' && <span className="text-ink-2">, {text.notScored}</span>}
        </>
      ),
    },
    {
      key: 'time',
      header: text.columns.time,
      align: 'end',
      nowrap: true,
      cell: (a) => (a.recognitionMs === null ? memberText.none : text.seconds(a.recognitionMs)),
    },
    {
      key: 'lostBy',
      header: text.columns.lostBy,
      cell: (a) => (a.lostBy === null ? memberText.none : todayText.lostBy(a.lostBy, a.named)),
    },
  ];
  return (
    <DataTable
      caption={text.latestCaption}
      captionHidden
      columns={columns}
      rows={answers}
      rowKey={(a) => a.id}
      density="tight"
    />
  );
}
