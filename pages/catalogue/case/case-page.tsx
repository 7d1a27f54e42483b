import { useEffect } from 'react';
import { useParams } from 'react-router';
import { useCall } from '#renderer/api.ts';
import { Awaited } from '#renderer/awaited.tsx';
import type { CatalogueCaseView } from '#shared/contracts/catalogue-case.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import { catalogueCaseText } from '#shared/text/catalogue-case.ts';
import { shellText } from '#shared/text/shell.ts';
import { Algorithms } from './algorithms.tsx';
import { CaseHead } from './case-head.tsx';
import { CaseViews } from './case-views.tsx';
import { Changes } from './changes.tsx';
import { Confusable } from './confusable.tsx';
import { Relations } from './relations.tsx';
import { Stepper } from './stepper.tsx';
import { Symmetry } from './symmetry.tsx';
import { TwoLook } from './two-look.tsx';

const text = catalogueCaseText;

/** One case, with all that the cube and the catalogue know of it. */
export function CasePage() {
  const { setKey = '', caseKey = '' } = useParams();
  const query = useCall(endpoints.catalogueCase, { setKey, caseKey });
  const { data } = query;
  const title = data ? text.name(data.setName, data.case.name) : text.title;
  useEffect(() => {
    document.title = `${title} · ${shellText.product}`;
  }, [title]);
  return (
    <Awaited query={query} missing={text.missing}>
      {(view) => <CaseContent view={view} />}
    </Awaited>
  );
}

function CaseContent({ view }: { view: CatalogueCaseView }) {
  return (
    <>
      <CaseHead view={view} />
      <div className="grid gap-x-14 gap-y-9 lg:grid-cols-[minmax(0,1fr)_21rem]">
        <div className="flex min-w-0 flex-col gap-9">
          <CaseViews view={view} />
          <Algorithms view={view} />
          <Stepper key={view.case.key} view={view} />
          <TwoLook view={view} />
          <Confusable view={view} />
        </div>
        <div className="flex min-w-0 flex-col gap-9">
          <Relations view={view} />
          <Symmetry view={view} />
          <Changes view={view} />
        </div>
      </div>
    </>
  );
}
