import { BigNumber, BigNumbers, TextLink } from '#renderer/ui/index.ts';
import type { CatalogueCaseView } from '#shared/contracts/catalogue-case.ts';
import { catalogueCaseText } from '#shared/text/catalogue-case.ts';
import { caseHref } from '../case-href.ts';
import { AliasForm } from '../own/alias-form.tsx';

const text = catalogueCaseText;

/** Which case it is, how often it is dealt, and the ways to its set and its neighbours. */
export function CaseHead({ view }: { view: CatalogueCaseView }) {
  const { setKey, setName, case: c, previous, next } = view;
  const beside = [c.group, c.skip || c.name.startsWith('#') ? '' : text.number(c.number)]
    .filter(Boolean)
    .join(', ');
  return (
    <header className="pb-7 pt-4">
      <nav
        aria-label={text.neighbours}
        className="screen-only flex flex-wrap items-center gap-x-6 text-[0.9375rem]"
      >
        <TextLink href={`/catalogue/${setKey}`} className="me-auto inline-flex min-h-12 items-center">
          {setName}
        </TextLink>
        {previous && (
          <TextLink href={caseHref(setKey, previous.key)} className="inline-flex min-h-12 items-center">
            {text.previous(previous.name)}
          </TextLink>
        )}
        {next && (
          <TextLink href={caseHref(setKey, next.key)} className="inline-flex min-h-12 items-center">
            {text.next(next.name)}
          </TextLink>
        )}
      </nav>
      <h1 className="text-[1.75rem] font-bold tracking-[-0.01em] sm:text-[2rem]">
        {text.name(setName, c.name)}
        {c.alias !== null && (
          <span className="ms-4 text-lg font-normal text-ink-2">{text.alias(c.alias)}</span>
        )}
      </h1>
      <p className="mb-5 mt-1 text-ink-2">{c.skip ? text.skip : beside}</p>
      <BigNumbers>
        <BigNumber value={text.fraction(c.prior)} label={text.prior(c.prior.weight, c.prior.total)} />
        <BigNumber value={text.solves(c.prior)} label={text.dealtOnceIn} />
        <BigNumber tone="quiet" value={String(c.angles)} label={text.angles(c.angles)} />
      </BigNumbers>
      {!c.skip && <AliasForm setKey={setKey} caseKey={c.key} alias={c.alias} />}
    </header>
  );
}
