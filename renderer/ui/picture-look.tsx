import { createContext, type ReactNode, useContext } from 'react';
import { PALETTES, type Palette } from '#shared/lastlayer/pictures/index.ts';

/** How cube pictures are drawn wherever nothing else is said. */
export interface PictureLook {
  readonly palette: Palette;
  /** Each colour's letter is laid on its stickers. */
  readonly letters: boolean;
}

const USUAL: PictureLook = { palette: PALETTES.standard, letters: false };

const Context = createContext<PictureLook>(USUAL);

/** Inside it all pictures look so. */
export function PictureLookProvider({ look, children }: { look: PictureLook; children: ReactNode }) {
  return <Context value={look}>{children}</Context>;
}

/** The look of pictures here; the usual one outside any provider. */
export function usePictureLook(): PictureLook {
  return useContext(Context);
}
