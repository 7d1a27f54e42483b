import { useNavigate } from 'react-router';
import { AppLink, Button, cx, SelectField, TextLink } from '#renderer/ui/index.ts';
import { useScripts } from '#renderer/use-scripts.ts';
import type { LedgerCasesInput, LedgerCasesView } from '#shared/contracts/ledger.ts';
import { MOST_ON_ONE_PAGE } from '#shared/contracts/ledger-lists.ts';
import { ledgerText } from '#shared/text/ledger.ts';
import { stepQuery } from '../ledger-query.ts';
import { casesHref } from './cases-query.ts';

const text = ledgerText.list;

/** Which of the cases are listed: by their angles, by their group, and all of them as a file. */
export function ListFilters({ view, input }: { view: LedgerCasesView; input: LedgerCasesInput }) {
  const navigate = useNavigate();
  const atOnce = useScripts();
  const step = { entry: view.entry, aspects: view.aspects };
  const { angles, group, sort, order, size } = input;
  const links = [undefined, ...view.angles];
  return (
    <div className="screen-only flex flex-wrap items-end gap-x-8 gap-y-3 pb-5">
      {view.angles.length > 1 && (
        <nav aria-label={text.filters}>
          <ul className="flex flex-wrap gap-x-5">
            {links.map((some) => (
              <li key={some ?? 0}>
                <AppLink
                  href={casesHref(step, { angles: some, group, sort, order, size })}
                  aria-current={some === angles ? 'true' : undefined}
                  className={cx(
                    'inline-flex min-h-12 items-center',
                    some === angles
                      ? 'font-bold text-ink underline decoration-2 underline-offset-8'
                      : 'text-ink-2 hover:text-ink hover:underline',
                  )}
                >
                  {some === undefined ? text.anyAngles : text.withAngles(some)}
                </AppLink>
              </li>
            ))}
          </ul>
        </nav>
      )}
      {view.groups.length > 1 && (
        <form method="get" action="/ledger/cases" className="flex items-end gap-3">
          <input type="hidden" name="entry" value={step.entry} />
          <input type="hidden" name="aspects" value={step.aspects.join(',')} />
          {angles && <input type="hidden" name="angles" value={angles} />}
          {sort && <input type="hidden" name="sort" value={sort} />}
          {order && <input type="hidden" name="order" value={order} />}
          {size && <input type="hidden" name="size" value={size} />}
          <SelectField
            id="group"
            name="group"
            label={text.group}
            value={group ?? ''}
            options={[
              { value: '', label: text.anyGroup },
              ...view.groups.map((one) => ({ value: one, label: one })),
            ]}
            onChange={({ target }) =>
              navigate(casesHref(step, { angles, group: target.value || undefined, sort, order, size }))
            }
          />
          {!atOnce && (
            <Button type="submit" kind="outlined">
              {text.go}
            </Button>
          )}
        </form>
      )}
      {view.pages > 1 && view.found <= MOST_ON_ONE_PAGE && (
        <TextLink
          href={casesHref(step, { angles, group, sort, order, size: 'most' })}
          className="inline-flex min-h-12 items-center"
        >
          {text.onePage(view.found)}
        </TextLink>
      )}
      <a className="link inline-flex min-h-12 items-center" href={`/ledger.csv?${stepQuery(step)}`} download>
        {ledgerText.csv}
      </a>
    </div>
  );
}
