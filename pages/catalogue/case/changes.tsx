import { Instant } from '#renderer/instant.tsx';
import { AlgorithmText, Section, TextLink } from '#renderer/ui/index.ts';
import type { CatalogueCaseView } from '#shared/contracts/catalogue-case.ts';
import { catalogueCaseText } from '#shared/text/catalogue-case.ts';

const text = catalogueCaseText.changes;

/** In which editions its algorithms changed, and how. */
export function Changes({ view: { setKey, changes, case: c } }: { view: CatalogueCaseView }) {
  if (c.skip) return null;
  return (
    <Section title={text.title} ruled>
      {changes.length === 0 && <p className="pt-3 text-ink-2">{text.none}</p>}
      <ol>
        {changes.map(({ edition, publishedAt, added, removed, reordered }) => (
          <li key={edition} className="border-b border-hair py-3">
            <p>
              <TextLink href={`/catalogue/${setKey}/editions/${edition}`}>{text.edition(edition)}</TextLink>
              <span className="ps-3 text-[0.9375rem] text-ink-2">
                <Instant at={publishedAt} />
              </span>
            </p>
            <Part says={text.added(added.length)} algorithms={added} />
            <Part says={text.removed(removed.length)} algorithms={removed} struck />
            {reordered && <p className="text-[0.9375rem] text-ink-2">{text.reordered}</p>}
          </li>
        ))}
      </ol>
    </Section>
  );
}

function Part({
  says,
  algorithms,
  struck = false,
}: {
  says: string;
  algorithms: readonly string[];
  struck?: boolean;
}) {
  if (algorithms.length === 0) return null;
  return (
    <div className="text-[0.9375rem]">
      <p className="text-ink-2">{says}</p>
      <ul>
        {algorithms.map((algorithm) => (
          <li key={algorithm}>
            {struck ? (
              <s>
                <AlgorithmText text={algorithm} />
              </s>
            ) : (
              <AlgorithmText text={algorithm} />
            )}
          </li>
        ))}
      </ul>
    </div>
  );
}
