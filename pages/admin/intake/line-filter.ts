import type { DraftLine } from '#shared/contracts/intake.ts';

/** What of a draft's lines is shown, as the address says it (`?show=settle`). */
export const SHOWS = ['all', 'settle', 'cannot', 'fine', 'dropped'] as const;
export type Show = (typeof SHOWS)[number];

export function showFrom(word: string | null): Show {
  return SHOWS.find((show) => show === word) ?? 'all';
}

export const isBlocking = ({ standing }: DraftLine): boolean =>
  standing === 'cannot' || standing === 'decide';

export function isShown(line: DraftLine, show: Show): boolean {
  switch (show) {
    case 'all':
      return true;
    case 'settle':
      return isBlocking(line);
    case 'cannot':
      return line.standing === 'cannot';
    case 'fine':
      return line.standing === 'fine';
    case 'dropped':
      return line.standing === 'out';
  }
}
