import { ChoiceGroup } from '#renderer/ui/index.ts';
import { ASPECTS } from '#shared/contracts/entries.ts';
import { setMakingText } from '#shared/text/set-making.ts';
import type { Definition } from './definition.ts';

type Aspects = Definition['toldApart'];

/** Any of the four aspects, in a ruled column. */
export function AspectChoices({
  id,
  legend,
  hint,
  error,
  value,
  onChange,
}: {
  id: string;
  legend: string;
  hint: string;
  error?: string;
  value: Aspects;
  onChange(value: Aspects): void;
}) {
  return (
    <ChoiceGroup
      id={id}
      name={id}
      kind="many"
      legend={legend}
      hint={hint}
      error={error}
      choices={ASPECTS.map((aspect) => ({ value: aspect, label: setMakingText.aspects[aspect] }))}
      value={value}
      onChange={({ currentTarget: { checked, value: aspect } }) =>
        onChange(ASPECTS.filter((one) => (one === aspect ? checked : value.includes(one))))
      }
    />
  );
}
