import { useEffect, useId, useRef, useState } from 'react';
import { Button, FlatView } from '#renderer/ui/index.ts';
import { setMakingText } from '#shared/text/set-making.ts';
import type { CaseChoice, CaseGroup } from './choosing.ts';

const text = setMakingText.subset;

export interface GroupOfCasesProps {
  readonly group: CaseGroup;
  /** The only group: its cases are open to choose from. */
  readonly alone: boolean;
  readonly chosen: ReadonlySet<string>;
  onTake(cases: readonly CaseChoice[], take: boolean): void;
}

/** One group: taken as a whole, or opened and chosen from. Pictures are drawn only of what is open. */
export function GroupOfCases({ group: { name, cases }, alone, chosen, onTake }: GroupOfCasesProps) {
  const id = useId();
  const [open, setOpen] = useState(alone);
  const box = useRef<HTMLInputElement>(null);
  const taken = cases.filter(({ key }) => chosen.has(key)).length;
  const some = taken > 0 && taken < cases.length;
  useEffect(() => {
    if (box.current) box.current.indeterminate = some;
  }, [some]);
  const label = name || text.noGroup;
  return (
    <li className="border-b border-hair">
      <div className="flex flex-wrap items-center gap-x-4">
        <label className="flex min-h-12 min-w-0 flex-1 items-center gap-3 py-1 has-checked:font-bold">
          <input
            ref={box}
            type="checkbox"
            className="choice"
            checked={taken === cases.length}
            onChange={(event) => onTake(cases, event.currentTarget.checked)}
          />
          {label}
        </label>
        <span className="text-[0.9375rem] text-ink-2">{text.chosen(taken, cases.length)}</span>
        <Button
          kind="plain"
          size="small"
          aria-expanded={open}
          aria-controls={id}
          aria-label={text.show(label)}
          onClick={() => setOpen(!open)}
        >
          {text.single}
        </Button>
      </div>
      <fieldset id={id} hidden={!open} className="pb-4">
        <legend className="sr-only">{text.legend(label)}</legend>
        {open && (
          <ul className="grid grid-cols-[repeat(auto-fill,minmax(7.5rem,1fr))] gap-2">
            {cases.map((c) => (
              <li key={c.key}>
                <Case of={c} checked={chosen.has(c.key)} onTake={(take) => onTake([c], take)} />
              </li>
            ))}
          </ul>
        )}
      </fieldset>
    </li>
  );
}

function Case({ of: c, checked, onTake }: { of: CaseChoice; checked: boolean; onTake(take: boolean): void }) {
  return (
    <label className="frame flex h-full flex-col gap-1 bg-sheet p-2 has-checked:bg-hair has-checked:font-bold">
      <span className="flex items-start justify-between gap-2">
        <FlatView
          stickers={c.picture.stickers}
          colouring={c.picture.colouring}
          alt="hidden"
          className="w-14"
        />
        <input
          type="checkbox"
          className="choice"
          checked={checked}
          onChange={(event) => onTake(event.currentTarget.checked)}
        />
      </span>
      <span className="break-words leading-tight">
        {c.alias ?? c.name}
        {c.alias !== null && <span className="ps-1.5 text-sm font-normal text-ink-2">{c.name}</span>}
        {!c.known && <span className="block text-sm font-normal text-ink-2">{text.noAlgorithm}</span>}
      </span>
    </label>
  );
}
