import type { CatalogueSheetInput } from '#shared/contracts/catalogue-sheet.ts';

type Words = Readonly<Record<string, string | undefined>>;

/** What the address of a sheet asks for. What makes no sense in it counts as not said. */
export function sheetInput(setKey: string, { edition, group }: Words): CatalogueSheetInput {
  return {
    setKey,
    ...(edition && /^[1-9]\d{0,5}$/.test(edition) ? { edition: Number(edition) } : {}),
    ...(group ? { group: group.slice(0, 200) } : {}),
  };
}

export interface SheetLook {
  /** Each case's first algorithm only. */
  readonly first: boolean;
  /** In the person's own colours; greys unless asked for. */
  readonly colours: boolean;
}

/** How the sheet is to look; it stands in the address too, so that a sheet can be sent on as it is. */
export function lookOf({ algorithms, shades }: Words): SheetLook {
  return { first: algorithms === 'first', colours: shades === 'colours' };
}
