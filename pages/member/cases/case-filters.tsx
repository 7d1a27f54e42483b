import { SelectField, TextField } from '#renderer/ui/index.ts';
import { useRestingText } from '#renderer/use-resting-text.ts';
import type { MyCasesView } from '#shared/contracts/member.ts';
import { memberText } from '#shared/text/member.ts';
import { type CaseFilter, SORTS } from './filter-cases.ts';

const text = memberText.cases;

/** Set, state, text and order. What is chosen stands in the address, so that a view can be sent on. */
export function CaseFilters({
  sets,
  filter,
  onChange,
}: {
  sets: MyCasesView['sets'];
  filter: CaseFilter;
  onChange: (part: Partial<CaseFilter>) => void;
}) {
  return (
    <search className="grid grid-cols-2 gap-3 py-4 sm:grid-cols-4">
      <SelectField
        id="case-set"
        label={text.set}
        value={filter.set}
        onChange={(event) => onChange({ set: event.target.value })}
        options={[
          { value: '', label: text.allSets },
          ...sets.map(({ setKey, name }) => ({ value: setKey, label: name })),
        ]}
      />
      <SelectField
        id="case-state"
        label={text.state}
        value={filter.state}
        onChange={(event) => onChange({ state: event.target.value })}
        options={[
          { value: '', label: text.allStates },
          ...Object.entries(memberText.states).map(([value, label]) => ({ value, label })),
        ]}
      />
      <FindField text={filter.text} onFind={(found) => onChange({ text: found })} />
      <SelectField
        id="case-sort"
        label={text.sort}
        value={filter.sort}
        onChange={(event) => onChange({ sort: SORTS.find((sort) => sort === event.target.value) ?? 'prior' })}
        options={SORTS.map((sort) => ({ value: sort, label: text.sorts[sort] }))}
      />
    </search>
  );
}

function FindField({ text: inAddress, onFind }: { text: string; onFind: (text: string) => void }) {
  const [letters, setLetters] = useRestingText(inAddress, onFind);
  return (
    <TextField
      id="case-find"
      type="search"
      label={text.search}
      placeholder={text.searchHint}
      value={letters}
      autoComplete="off"
      onChange={(event) => setLetters(event.target.value)}
    />
  );
}
