import { useLocation, useParams, useSearchParams } from 'react-router';
import { useCall } from '#renderer/api.ts';
import { Awaited } from '#renderer/awaited.tsx';
import { PageLinks, pageOf } from '#renderer/page-links.tsx';
import { queryHref } from '#renderer/query-href.ts';
import { Notice, TextLink } from '#renderer/ui/index.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import type { DraftView } from '#shared/contracts/intake.ts';
import { intakeText } from '#shared/text/intake.ts';
import { DraftKeys } from './draft-keys.tsx';
import { DraftNumbers } from './draft-numbers.tsx';
import { FilterLinks } from './filter-links.tsx';
import { isShown, showFrom } from './line-filter.ts';
import { LineTable } from './line-table.tsx';
import { type DraftSteps, useDraftSteps } from './use-draft-steps.ts';

const text = intakeText.draft;
const LINES_ON_A_PAGE = 200;

/** One file on its way to an edition: its lines, what the cube says of them, and the steps to publish it. */
export function DraftPage() {
  const { draftId = '' } = useParams();
  const query = useCall(endpoints.draft, { draftId });
  return (
    <Awaited query={query} loading={text.loading} failed={text.cannotLoad}>
      {(view) => <Draft view={view} />}
    </Awaited>
  );
}

function Draft({ view }: { view: DraftView }) {
  const steps = useDraftSteps(view);
  const [search] = useSearchParams();
  const { pathname } = useLocation();
  const show = showFrom(search.get('show'));
  const { rows, page, of } = pageOf(
    view.lines.filter((line) => isShown(line, show)),
    LINES_ON_A_PAGE,
    Number(search.get('page') ?? 1),
  );
  const pageHref = (to: number) => queryHref(search, pathname, { page: to === 1 ? null : String(to) });
  return (
    <>
      <header className="pt-6">
        <h1 className="break-words text-[1.75rem] font-bold tracking-[-0.01em] sm:text-[2rem]">
          {view.draft.fileName}
        </h1>
        <p className="mt-2 text-ink-2">{leadOf(view)}</p>
        {view.unknownColumns.length > 0 && (
          <p className="text-ink-2">{text.unknownColumns(view.unknownColumns)}</p>
        )}
        <Notices view={view} steps={steps} />
        <div className="flex flex-wrap items-end justify-between gap-x-4 gap-y-5 pb-5 pt-5">
          <DraftNumbers view={view} />
          <DraftKeys view={view} steps={steps} />
        </div>
      </header>
      <p role="status" className="sr-only">
        {steps.said}
      </p>
      <div className="pb-2">
        <FilterLinks
          lines={view.lines}
          open={view.draft.state === 'open'}
          show={show}
          hrefOf={(to) => queryHref(search, pathname, { show: to === 'all' ? null : to, page: null })}
        />
      </div>
      <LineTable lines={rows} open={view.draft.state === 'open'} steps={steps} empty={text.noLines[show]} />
      <PageLinks page={page} of={of} hrefOf={pageHref} />
    </>
  );
}

function leadOf({ draft, newestEdition }: DraftView): string {
  if (draft.state === 'published' && draft.editionNumber !== null) {
    return text.leadPublished(draft.setName, draft.editionNumber);
  }
  return draft.state === 'discarded'
    ? text.leadDiscarded(draft.setName)
    : text.lead(draft.setName, newestEdition);
}

function Notices({ view: { draft }, steps }: { view: DraftView; steps: DraftSteps }) {
  return (
    <div className="space-y-3 pt-4 empty:hidden">
      {steps.overtaken && (
        <Notice tone="ochre" title={text.stale.title} live>
          <p>{steps.overtaken}</p>
          <p>{text.stale.detail}</p>
        </Notice>
      )}
      {steps.refused && (
        <Notice tone="rose" title={text.refused} live>
          <p>{steps.refused}</p>
        </Notice>
      )}
      {draft.editionNumber !== null && (
        <Notice title={text.publishedNotice(draft.setName, draft.editionNumber)} live>
          <TextLink href={`/catalogue/${draft.setKey}/editions/${draft.editionNumber}`}>
            {text.openEdition}
          </TextLink>
        </Notice>
      )}
    </div>
  );
}
