import { useCall } from '#renderer/api.ts';
import { Awaited } from '#renderer/awaited.tsx';
import { SeatView, Section, TextLink } from '#renderer/ui/index.ts';
import type { CatalogueCaseView } from '#shared/contracts/catalogue-case.ts';
import type { ConfusableView } from '#shared/contracts/catalogue-search.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import { sitesApart } from '#shared/lastlayer/pictures/index.ts';
import { catalogueSearchText } from '#shared/text/catalogue-search.ts';
import { caseHref } from '../case-href.ts';

type Row = ConfusableView['rows'][number];
const text = catalogueSearchText.confusable;

/** The cases that look most like this one, each beside it in the two views that come nearest. */
export function Confusable({ view: { setKey, case: c } }: { view: CatalogueCaseView }) {
  const query = useCall(endpoints.catalogueConfusable, { setKey, caseKey: c.key });
  return (
    <Section title={text.title}>
      <Awaited query={query} loading={text.loading} failed={text.missing}>
        {({ name, rows }) => (
          <>
            <p className="rule-b pb-3 text-ink-2">{text.note}</p>
            <ul className="lg:grid lg:grid-cols-2 lg:gap-x-10">
              {rows.map((row) => (
                <li key={row.case.key} className="border-b border-hair py-4">
                  <Pair name={name} row={row} />
                </li>
              ))}
            </ul>
          </>
        )}
      </Awaited>
    </Section>
  );
}

function Pair({
  name,
  row: { case: other, apart, mirror, holding, shown, other: there, differs },
}: {
  name: string;
  row: Row;
}) {
  const marks = sitesApart(shown.stickers, there.stickers, { kind: 'seat', holding });
  const beside = [text.apart(apart), mirror ? text.mirror : null, text.held[holding]]
    .filter(Boolean)
    .join('; ');
  return (
    <>
      <div className="grid grid-cols-2 gap-x-5">
        <figure>
          <SeatView {...shown} holding={holding} marks={marks} />
          <figcaption className="pt-2">{name}</figcaption>
        </figure>
        <figure>
          <SeatView {...there} holding={holding} marks={marks} />
          <figcaption className="pt-2">
            <TextLink href={caseHref(other.setKey, other.key)} className="font-bold">
              {other.alias ?? other.name}
            </TextLink>{' '}
            {other.alias !== null && <span className="ps-1 text-sm text-ink-2">{other.name}</span>}
          </figcaption>
        </figure>
      </div>
      <p className="pt-2">{differs}</p>
      <p className="text-[0.9375rem] text-ink-2">{beside}</p>
    </>
  );
}
