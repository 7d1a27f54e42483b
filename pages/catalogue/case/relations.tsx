import type { ReactNode } from 'react';
import { AppLink, FlatView, Section } from '#renderer/ui/index.ts';
import type { CaseReference, CatalogueCaseView } from '#shared/contracts/catalogue-case.ts';
import { catalogueCaseText } from '#shared/text/catalogue-case.ts';
import { caseHref } from '../case-href.ts';

const text = catalogueCaseText.relations;
const SET_NAMES: Readonly<Record<string, string>> = { oll: 'OLL', pll: 'PLL' };

/** The cases this one leads to: mirror, inverse, both, and what it is made of. */
export function Relations({ view }: { view: CatalogueCaseView }) {
  const { mirror, inverse, mirrorInverse, orientation, permutation } = view;
  const own = (to: CaseReference) => (to.key === view.case.key ? text.itself : null);
  const undefinedHere = (
    <>
      {text.notDefined}
      <span className="block text-sm">{text.whyNot}</span>
    </>
  );
  return (
    <Section title={text.title} ruled>
      <dl>
        <Relation label={text.mirror} to={mirror} instead={own(mirror)} />
        <Relation label={text.inverse} to={inverse} instead={inverse ? own(inverse) : undefinedHere} />
        {mirrorInverse && (
          <Relation label={text.mirrorInverse} to={mirrorInverse} instead={own(mirrorInverse)} />
        )}
        {orientation && (
          <Relation
            label={text.orientation}
            to={orientation}
            ofSet
            instead={orientation.skip ? text.oriented : null}
          />
        )}
        {permutation && (
          <Relation
            label={text.permutation}
            to={permutation}
            ofSet
            instead={permutation.skip ? text.permuted : null}
          />
        )}
      </dl>
      {permutation && orientation && !orientation.skip && (
        <p className="pt-3 text-sm text-ink-2">{text.otherPermutation}</p>
      )}
    </Section>
  );
}

function Relation({
  label,
  to,
  instead,
  ofSet = false,
}: {
  label: string;
  to: CaseReference | null;
  /** Said in place of the case. */
  instead: ReactNode;
  /** The case is of another set: its name says of which. */
  ofSet?: boolean;
}) {
  return (
    <div className="grid min-h-14 grid-cols-[8.5rem_minmax(0,1fr)] items-center gap-x-4 border-b border-hair py-2">
      <dt className="text-ink-2">{label}</dt>
      <dd>
        {to && instead === null ? (
          <AppLink href={caseHref(to.setKey, to.key)} className="group flex items-center gap-4">
            <FlatView
              stickers={to.picture.stickers}
              colouring={to.picture.colouring}
              className="w-14 shrink-0"
            />
            <span className="min-w-0">
              <span className="link block font-bold group-hover:decoration-2">
                {ofSet ? `${SET_NAMES[to.setKey] ?? ''} ${to.name}` : (to.alias ?? to.name)}
              </span>
              <span className="block text-sm text-ink-2">
                {to.alias !== null && !ofSet ? to.name : to.group}
              </span>
            </span>
          </AppLink>
        ) : (
          <span className="text-ink-2">{instead}</span>
        )}
      </dd>
    </div>
  );
}
