import type { ReactNode } from 'react';
import { AlgorithmText, AppLink, FlatView, Section } from '#renderer/ui/index.ts';
import type { CatalogueCaseView, TwoLookRoute } from '#shared/contracts/catalogue-case.ts';
import { catalogueCaseText } from '#shared/text/catalogue-case.ts';
import { caseHref } from '../case-href.ts';

const text = catalogueCaseText.twoLook;

/** What the case costs without an algorithm of its own: orient, then permute. */
export function TwoLook({ view: { twoLook, algorithms } }: { view: CatalogueCaseView }) {
  if (twoLook === null) return null;
  return (
    <Section title={text.title}>
      {twoLook.length === 0 ? (
        <p className="text-ink-2">{text.none}</p>
      ) : (
        <>
          <p className="pb-3 text-ink-2">{text.note(algorithms[0]?.counts.stm ?? null)}</p>
          <ol className="rule-t">
            {twoLook.map((route) => (
              <li
                key={`${route.before} ${route.orient?.algorithm}`}
                className="grid gap-x-6 gap-y-2 border-b border-hair py-3 lg:grid-cols-[4.5rem_minmax(0,1fr)_minmax(0,1fr)_auto]"
              >
                <Route route={route} />
              </li>
            ))}
          </ol>
        </>
      )}
    </Section>
  );
}

function Route({ route: { before, orient, between, permute, after, stm } }: { route: TwoLookRoute }) {
  return (
    <>
      <span className="text-lg font-bold whitespace-nowrap">{text.moves(stm)}</span>
      {orient && <Look look={orient} set="OLL" auf={before} />}
      {permute ? (
        <Look look={permute} set="PLL" auf={between} />
      ) : (
        <span className="text-ink-2">{text.nothing}</span>
      )}
      <span className="whitespace-nowrap text-ink-2 lg:min-w-24">
        {after !== 0 && <Turn>{text.lastAuf(after)}</Turn>}
      </span>
    </>
  );
}

function Look({ look, set, auf }: { look: NonNullable<TwoLookRoute['orient']>; set: string; auf: number }) {
  const { case: of, algorithm } = look;
  return (
    <span className="flex min-w-0 items-start gap-4">
      <AppLink href={caseHref(of.setKey, of.key)} className="shrink-0 text-center">
        <FlatView stickers={of.picture.stickers} colouring={of.picture.colouring} className="w-14" />
        <span className="link block text-sm">{`${set} ${of.name}`}</span>
      </AppLink>
      <span className="min-w-0">
        {auf !== 0 && <Turn>{text.auf(auf)}</Turn>}
        <AlgorithmText text={algorithm} className="block break-words" />
      </span>
    </span>
  );
}

function Turn({ children }: { children: ReactNode }) {
  return <span className="block text-[0.9375rem] text-ink-2">{children}</span>;
}
