import { useEffect } from 'react';
import { useParams } from 'react-router';
import { useCall } from '#renderer/api.ts';
import { Awaited } from '#renderer/awaited.tsx';
import { PageTitle, TextLink } from '#renderer/ui/index.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import { setMakingText } from '#shared/text/set-making.ts';
import { shellText } from '#shared/text/shell.ts';
import { Chooser } from './chooser.tsx';

const text = setMakingText.subset;

/** Some of a set's cases are chosen, by group or one by one, and made a set of their own. */
export function SubsetPage() {
  const { setKey = '' } = useParams();
  const query = useCall(endpoints.caseChoices, { setKey });
  const title = query.data ? text.titleOf(query.data.name) : text.title;
  useEffect(() => {
    document.title = `${title} · ${shellText.product}`;
  }, [title]);
  return (
    <>
      <PageTitle title={title} lead={text.lead}>
        {query.data && (
          <TextLink href={`/catalogue/${setKey}`} className="inline-flex min-h-12 items-center">
            {text.back(query.data.name)}
          </TextLink>
        )}
      </PageTitle>
      <Awaited query={query}>{(view) => <Chooser key={setKey} view={view} />}</Awaited>
    </>
  );
}
