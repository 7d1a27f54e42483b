import { useMemo } from 'react';
import { Notice } from '#renderer/ui/index.ts';
import type { OwnShades } from '#shared/contracts/pictures.ts';
import { COLOUR_NAMES } from '#shared/lastlayer/pictures/index.ts';
import { TOLD_APART, tooNear } from '#shared/lastlayer/pictures/shade-warnings.ts';
import { pictureSettingsText as text } from '#shared/text/picture-settings.ts';

/** A shade for each colour, and which of them come too near each other to be told apart. */
export function OwnShadesFields({
  shades,
  onChange,
}: {
  shades: OwnShades;
  onChange: (shades: OwnShades) => void;
}) {
  const near = useMemo(() => tooNear(shades), [shades]);
  return (
    <div>
      <fieldset className="min-w-0">
        <legend className="pb-1 text-[0.9375rem] text-ink-2">{text.shades}</legend>
        <p className="pb-2 text-sm text-ink-2">{text.shadesHint}</p>
        <div className="grid grid-cols-2 gap-x-6 gap-y-3 sm:grid-cols-3">
          {COLOUR_NAMES.map((name) => (
            <label key={name} className="flex min-h-12 items-center gap-3">
              <input
                type="color"
                name={name}
                value={shades[name].toLowerCase()}
                onChange={(event) => onChange({ ...shades, [name]: event.target.value.toUpperCase() })}
                className="h-12 w-14 shrink-0 cursor-pointer rounded-key border-[1.5px] border-ink bg-sheet p-1"
              />
              <span>
                {text.shadeOf(name)}
                <span className="block text-sm text-ink-2">{shades[name]}</span>
              </span>
            </label>
          ))}
        </div>
      </fieldset>
      <div role="status" className="mt-4 empty:hidden">
        {near.length > 0 && (
          <Notice tone="ochre" title={text.tooNear}>
            <ul className="mt-1">
              {near.map((pair) => (
                <li key={`${pair.one} ${pair.other}`}>{text.pair(pair)}</li>
              ))}
            </ul>
            <p className="mt-2 text-[0.9375rem]">{text.tooNearLead(TOLD_APART)}</p>
          </Notice>
        )}
      </div>
    </div>
  );
}
