import { useEffect } from 'react';
import { useParams, useSearchParams } from 'react-router';
import { useCall } from '#renderer/api.ts';
import { Awaited } from '#renderer/awaited.tsx';
import { Instant } from '#renderer/instant.tsx';
import { useSession } from '#renderer/session.tsx';
import { BigNumber, BigNumbers, LinkButton, Notice, PageTitle, TextLink } from '#renderer/ui/index.ts';
import type { CatalogueSetView } from '#shared/contracts/catalogue.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import { catalogueText } from '#shared/text/catalogue.ts';
import { numberText } from '#shared/text/numbers.ts';
import { shellText } from '#shared/text/shell.ts';
import { SetActions } from '../own/set-actions.tsx';
import { CasesCsvButton } from './cases-csv.tsx';
import { CasesTable } from './cases-table.tsx';
import { EditionLinks } from './edition-links.tsx';
import { SetFilters } from './set-filters.tsx';
import { setInput, wordsOf } from './set-input.ts';

const text = catalogueText.set;

/** A set's cases: what it is, how many, and each with its picture, prior and algorithm. */
export function SetPage() {
  const { setKey = '' } = useParams();
  const [search] = useSearchParams();
  const query = useCall(endpoints.catalogueSet, setInput(setKey, wordsOf(search)), {
    keepWhileLoading: true,
  });
  const title = query.data?.setName ?? text.title;
  useEffect(() => {
    document.title = `${title} · ${shellText.product}`;
  }, [title]);
  return (
    <Awaited query={query}>
      {(view) => (
        <>
          <SetHead view={view} />
          <SetFilters key={setKey} view={view} />
          <CasesTable view={view} />
        </>
      )}
    </Awaited>
  );
}

function SetHead({ view }: { view: CatalogueSetView }) {
  const { setKey, setName, edition, cases, skip, withAlgorithm } = view;
  return (
    <>
      <p className="screen-only -mb-4 pt-4">
        <TextLink href="/catalogue" className="inline-flex min-h-12 items-center text-[0.9375rem]">
          {catalogueText.sets.title}
        </TextLink>
      </p>
      <PageTitle title={setName} lead={<SetLead view={view} />}>
        {edition !== null && (
          <LinkButton kind="outlined" href={`/catalogue/${setKey}/sheet`}>
            {text.sheet}
          </LinkButton>
        )}
        <CasesCsvButton setKey={setKey} />
        <SetActions
          setKey={setKey}
          name={setName}
          retired={view.retiredAt !== null}
          retirable={view.retirable}
          inUse={view.inUse}
        />
      </PageTitle>
      {view.retiredAt !== null && (
        <div className="pb-5">
          <Notice tone="ochre">
            <p>
              {text.retired} <Instant at={view.retiredAt} />: {text.retiredDetail}
            </p>
          </Notice>
        </div>
      )}
      <div className="flex flex-wrap items-end justify-between gap-x-8 gap-y-4 pb-5">
        <BigNumbers>
          <BigNumber value={numberText.whole(cases)} label={text.cases(cases)} />
          <BigNumber tone="quiet" value={numberText.fraction(skip.prior)} label={text.skip} />
          <BigNumber
            tone="quiet"
            value={text.withAlgorithm(withAlgorithm, cases)}
            label={text.withAlgorithmLabel}
          />
        </BigNumbers>
        <EditionLinks view={view} />
      </div>
    </>
  );
}

function SetLead({ view }: { view: CatalogueSetView }) {
  const { setKey, entry, mix, toldApart, solved, ofClub, retiredAt, cases, parent } = view;
  const { role } = useSession();
  const { entryOrMix, aspects } = catalogueText.sets;
  return (
    <>
      {text.lead(entryOrMix(entry, mix), aspects(toldApart), aspects(solved))}
      {parent && (
        <>
          {' '}
          {text.casesOf(cases, parent.cases)}{' '}
          <TextLink href={`/catalogue/${parent.setKey}`}>{parent.name}</TextLink>.
        </>
      )}
      {role === 'captain' && ofClub && parent === null && retiredAt === null && <> {text.key(setKey)}</>}
      {role === 'administrator' && ofClub && <> {text.keyOnly(setKey)}</>}
    </>
  );
}
