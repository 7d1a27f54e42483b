import { useLocation, useNavigate, useSearchParams } from 'react-router';
import { queryHref } from '#renderer/query-href.ts';
import { Button, SelectField } from '#renderer/ui/index.ts';
import { useScripts } from '#renderer/use-scripts.ts';
import type { CatalogueSheetView } from '#shared/contracts/catalogue-sheet.ts';
import { catalogueSheetText } from '#shared/text/catalogue-sheet.ts';

const text = catalogueSheetText.choices;

/** What goes on the paper. A plain form before scripts are there; not printed itself. */
export function SheetChoices({ view }: { view: CatalogueSheetView }) {
  const [search] = useSearchParams();
  const { pathname } = useLocation();
  const navigate = useNavigate();
  const scripts = useScripts();
  const field = (name: string) => ({
    id: `sheet-${name}`,
    name,
    value: search.get(name) ?? '',
    onChange: ({ target }: { target: { value: string } }) => {
      const href = queryHref(search, pathname, { [name]: target.value || null });
      void navigate(href, { replace: true, preventScrollReset: true });
    },
  });
  return (
    <search className="screen-only block pt-5">
      <form action={pathname} method="get" className="flex flex-wrap items-end gap-4">
        {search.get('edition') !== null && (
          <input type="hidden" name="edition" value={search.get('edition') ?? ''} />
        )}
        {view.groupNames.length > 0 && (
          <div className="w-full sm:w-52">
            <SelectField
              {...field('group')}
              label={text.group}
              options={[
                { value: '', label: text.allGroups },
                ...view.groupNames.map((name) => ({ value: name, label: name })),
              ]}
            />
          </div>
        )}
        <div className="w-full sm:w-52">
          <SelectField
            {...field('algorithms')}
            label={text.algorithms}
            options={[
              { value: '', label: text.all },
              { value: 'first', label: text.first },
            ]}
          />
        </div>
        <div className="w-full sm:w-52">
          <SelectField
            {...field('shades')}
            label={text.shades}
            options={[
              { value: '', label: text.greys },
              { value: 'colours', label: text.colours },
            ]}
          />
        </div>
        {scripts ? (
          <Button onClick={() => window.print()}>{text.print}</Button>
        ) : (
          <Button kind="outlined" type="submit">
            {text.show}
          </Button>
        )}
      </form>
    </search>
  );
}
