import { useState } from 'react';
import { useSearchParams } from 'react-router';
import { send } from '#renderer/api.ts';
import { csvOf, downloadCsv } from '#renderer/csv.ts';
import { Button } from '#renderer/ui/index.ts';
import type { CatalogueCasesView } from '#shared/contracts/catalogue.ts';
import { call } from '#shared/contracts/endpoint.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import { catalogueText } from '#shared/text/catalogue.ts';
import { filterInput, wordsOf } from './set-input.ts';

const text = catalogueText.set;

/** Cases as a table for a spreadsheet: a line each, with the prior as weight and total, and every algorithm. */
export function casesCsv({ rows }: CatalogueCasesView): string {
  return csvOf([
    text.csvColumns,
    ...rows.map(({ number, name, alias, group, prior, angles, algorithms }) => [
      number,
      name,
      alias ?? '',
      group,
      angles,
      prior.weight,
      prior.total,
      algorithms.join('; '),
    ]),
  ]);
}

/** Hands over all that the filters find, not the page alone. */
export function CasesCsvButton({ setKey }: { setKey: string }) {
  const [search] = useSearchParams();
  const [state, setState] = useState<'idle' | 'busy' | 'failed'>('idle');
  const download = async () => {
    setState('busy');
    try {
      const view = await send(call(endpoints.catalogueCases, filterInput(setKey, wordsOf(search))));
      downloadCsv(text.csvFile(setKey), casesCsv(view));
      setState('idle');
    } catch {
      setState('failed');
    }
  };
  return (
    <>
      <Button kind="outlined" busy={state === 'busy'} onClick={() => void download()}>
        {text.csv}
      </Button>
      {state === 'failed' && (
        <p role="alert" className="w-full text-rose">
          {text.csvFailed}
        </p>
      )}
    </>
  );
}
