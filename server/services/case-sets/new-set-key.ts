import type { Deps } from '../context.ts';

const LETTERS = 'abcdefghijkmnpqrstuvwxyz23456789';

/**
 * A key for a new set, for addresses: the name in small letters and hyphens, and six letters by chance, so that
 * two clubs can call a set the same and neither learns of the other's.
 */
export function newSetKey({ random }: Pick<Deps, 'random'>, name: string): string {
  const words = name
    .normalize('NFKD')
    .toLowerCase()
    .replace(/\p{M}/gu, '')
    .replace(/[^a-z0-9]+/gu, '-')
    .replace(/^-+|-+$/gu, '')
    .slice(0, 40);
  const chance = Array.from({ length: 6 }, () => LETTERS[Math.floor(random() * LETTERS.length)]).join('');
  return [words, chance].filter(Boolean).join('-');
}
