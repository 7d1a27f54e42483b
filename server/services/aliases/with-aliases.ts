import type { EditionCase, EditionContent } from '../catalogue/read-edition.ts';

/**
 * An edition as a club speaks of it: cases go by their aliases, the edition's own name beside. The order of the
 * cases stays that of the edition's names, so that an alias moves nothing on a grid of names.
 */
export function withAliases(content: EditionContent, aliases: ReadonlyMap<string, string>): EditionContent {
  if (aliases.size === 0) return content;
  const cases = new Map<string, EditionCase>();
  for (const [key, c] of content.cases) {
    const alias = aliases.get(key);
    cases.set(key, alias === undefined ? c : { ...c, name: alias, tradeName: c.name });
  }
  return { ...content, cases };
}
