import { csvOf } from '#shared/text/csv.ts';
import { ledgerText } from '#shared/text/ledger.ts';
import { keeping } from './kept.ts';
import { countStep, priorOf, type Step } from './step-cases.ts';

const keep = keeping<string>(16);

/** All cases of a step as a CSV file: a prior in two columns, because a spreadsheet reads 1/18 as a day in January. */
export function ledgerCsv(step: Step): { name: string; content: string } {
  const { entry, aspects } = step;
  const content = keep(`${entry} ${aspects.join()}`, () => {
    const { ledger, trade, cases } = countStep(step);
    return csvOf([
      ledgerText.csvFile.head,
      ...cases.map((one) => {
        const { numerator, denominator } = priorOf(one, ledger);
        return [
          one.number,
          ledgerText.csvFile.caseName(trade?.name ?? null, one.name),
          one.group,
          one.key,
          one.angles,
          one.weight,
          numerator,
          denominator,
          denominator / numerator,
        ];
      }),
    ]);
  });
  return { name: ledgerText.csvFile.name(entry, aspects), content };
}
