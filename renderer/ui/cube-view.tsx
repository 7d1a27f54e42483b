import { useMemo } from 'react';
import { CUBE_VIEW_BOX, cubeSeatViewInner, describeCube } from '#shared/lastlayer/pictures/cube-view.ts';
import { type Colouring, type Holding, TABLE_COLOURING } from '#shared/lastlayer/pictures/index.ts';
import { pictureText } from '#shared/text/pictures.ts';
import { usePictureLook } from './picture-look.tsx';

export interface CubeViewProps {
  /** 54 stickers: see shared/lastlayer/facelets.ts. */
  readonly facelets: string;
  readonly holding: Holding;
  readonly colouring?: Colouring;
  readonly className?: string;
}

/** A whole cube from the seat, described by the stickers of its three faces in view. */
export function CubeView({ facelets, holding, colouring = TABLE_COLOURING, className }: CubeViewProps) {
  const { palette, letters } = usePictureLook();
  const html = useMemo(
    () => ({ __html: cubeSeatViewInner({ facelets, colouring, holding, palette, letters }) }),
    [facelets, colouring, holding, palette, letters],
  );
  return (
    <svg
      role="img"
      aria-label={describeCube({ facelets, colouring, holding }, pictureText)}
      viewBox={CUBE_VIEW_BOX}
      focusable="false"
      className={`seat-view ${className ?? 'w-full'}`}
      dangerouslySetInnerHTML={html}
    />
  );
}
