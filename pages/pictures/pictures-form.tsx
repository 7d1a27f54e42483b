import { type FormEvent, useState } from 'react';
import { useSend } from '#renderer/api.ts';
import { lookOf, usePersonPictures } from '#renderer/person-pictures.tsx';
import { Button, ChoiceGroup, Notice } from '#renderer/ui/index.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import type { PictureSettings } from '#shared/contracts/pictures.ts';
import { type CrossColours, PALETTES } from '#shared/lastlayer/pictures/index.ts';
import { pictureSettingsText as text } from '#shared/text/picture-settings.ts';
import { OwnShadesFields } from './own-shades.tsx';
import { PaletteSwatch } from './palette-swatch.tsx';
import { Preview } from './preview.tsx';

type Key = PictureSettings['palette'];
const KEYS = Object.keys(text.hints) as Key[];

/** How pictures are drawn for whoever is signed in: chosen beside a preview, true everywhere once saved. */
export function PicturesForm({
  cross = 'all',
}: {
  /** The person's cross colours; whoever does not train sees any. */
  cross?: CrossColours;
}) {
  const { settings, change } = usePersonPictures();
  const [form, setForm] = useState(settings);
  const save = useSend(endpoints.changePictures, { onDone: change });
  const edit = (part: Partial<PictureSettings>) => {
    save.reset();
    setForm((before) => ({ ...before, ...part }));
  };
  const submit = (event: FormEvent) => {
    event.preventDefault();
    save.mutate(form);
  };
  const look = lookOf(form);
  // Whoever begins with own shades begins with the standard ones.
  const ownShades = form.ownShades ?? PALETTES.standard.colours;
  return (
    <form noValidate onSubmit={submit} className="flex flex-col gap-6">
      <div className="grid gap-x-12 gap-y-6 lg:grid-cols-[minmax(0,34rem)_1fr]">
        <section aria-label={text.preview} className="min-w-0 lg:sticky lg:top-6 lg:order-last lg:self-start">
          <p className="pb-2 text-[0.9375rem] text-ink-2">{text.preview}</p>
          <Preview look={look} cross={cross} />
        </section>
        <div className="flex min-w-0 flex-col gap-6">
          <ChoiceGroup
            id="palette"
            name="palette"
            kind="one"
            legend={text.palette}
            choices={KEYS.map((value) => ({
              value,
              label: text.palettes[value],
              hint: (
                <>
                  {text.hints[value]}
                  <PaletteSwatch palette={lookOf({ palette: value, letters: false, ownShades }).palette} />
                </>
              ),
            }))}
            value={[form.palette]}
            onChange={({ target }) => {
              const palette = KEYS.find((key) => key === target.value) ?? 'standard';
              edit(palette === 'own' ? { palette, ownShades } : { palette });
            }}
          />
          {form.palette === 'own' && (
            <OwnShadesFields shades={ownShades} onChange={(shades) => edit({ ownShades: shades })} />
          )}
          <ChoiceGroup
            id="letters"
            name="letters"
            kind="many"
            legend={text.letters}
            choices={[{ value: 'on', label: text.lettersLabel, hint: text.lettersHint }]}
            value={form.letters ? ['on'] : []}
            onChange={({ target }) => edit({ letters: target.checked })}
          />
        </div>
      </div>
      {save.isError && (
        <Notice tone="rose" title={text.notSaved} live>
          <p>{save.error.message}</p>
        </Notice>
      )}
      {save.isSuccess && (
        <Notice live>
          <p>{text.saved}</p>
        </Notice>
      )}
      <div>
        <Button type="submit" busy={save.isPending}>
          {save.isPending ? text.saving : text.save}
        </Button>
      </div>
    </form>
  );
}
