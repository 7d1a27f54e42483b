import { createContext, type ReactNode, useContext, useMemo, useState } from 'react';
import type { PictureSettings } from '#shared/contracts/pictures.ts';
import { ownPalette, PALETTES } from '#shared/lastlayer/pictures/index.ts';
import { type PictureLook, PictureLookProvider } from './ui/index.ts';

const USUAL: PictureSettings = { palette: 'standard', letters: false, ownShades: null };

interface PersonPictures {
  readonly settings: PictureSettings;
  /** What was saved just now: every picture on the page follows. */
  change(settings: PictureSettings): void;
}

const Context = createContext<PersonPictures | null>(null);

/** The look that somebody's settings make. Own shades that were never chosen are the standard ones. */
export function lookOf({ palette, letters, ownShades }: PictureSettings): PictureLook {
  if (palette !== 'own') return { palette: PALETTES[palette], letters };
  return { palette: ownShades ? ownPalette(ownShades) : PALETTES.standard, letters };
}

/** Draws pictures as whoever is signed in wants them: what the session says, until they change it here. */
export function PersonPicturesProvider({
  settings: first,
  children,
}: {
  /** Null where nobody is signed in. */
  settings: PictureSettings | null;
  children: ReactNode;
}) {
  const [settings, change] = useState(first ?? USUAL);
  const person = useMemo(() => ({ settings, change }), [settings]);
  const look = useMemo(() => lookOf(settings), [settings]);
  return (
    <Context value={person}>
      <PictureLookProvider look={look}>{children}</PictureLookProvider>
    </Context>
  );
}

/** How pictures are drawn for whoever is signed in. Only inside an area. */
export function usePersonPictures(): PersonPictures {
  const person = useContext(Context);
  if (!person) throw new Error('usePersonPictures outside of an area.');
  return person;
}
