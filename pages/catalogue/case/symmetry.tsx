import { Section } from '#renderer/ui/index.ts';
import type { CatalogueCaseView } from '#shared/contracts/catalogue-case.ts';
import { catalogueCaseText } from '#shared/text/catalogue-case.ts';

const text = catalogueCaseText.symmetry;

/** The turns that leave the case as it is, in words. */
export function Symmetry({ view: { stabiliser, case: c } }: { view: CatalogueCaseView }) {
  const turns = text.turns(stabiliser);
  return (
    <Section title={text.title} ruled>
      <p className="pt-3">{text.words(c.angles)}</p>
      {turns && <p className="pt-1 text-ink-2">{turns}</p>}
    </Section>
  );
}
