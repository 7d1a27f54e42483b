import type { PreviewSetInput, SetPreview } from '#shared/contracts/case-sets.ts';
import { type CaseSet, tradeSetLike } from '#shared/lastlayer/index.ts';
import { caseSetText } from '#shared/text/case-sets.ts';
import type { Ctx } from '../context.ts';
import { asDefiner } from './as-definer.ts';
import { buildDefinition, setWithSameCases, structureOfWords } from './build-definition.ts';

const { problems } = caseSetText;

/**
 * What a definition comes to, before anything is made; what stands in its way is told, not refused.
 * @throws Problem invalid for words that are not known.
 */
export async function previewSet(ctx: Ctx, input: PreviewSetInput): Promise<SetPreview> {
  const structure = structureOfWords(input);
  return asDefiner(ctx, async (tx, definer) => {
    let set: CaseSet;
    try {
      set = buildDefinition({ key: 'preview', name: problems.thisSet }, structure);
    } catch (error) {
      if (!(error instanceof RangeError)) throw error;
      return { problem: error.message, counts: null, like: null, algorithmsFrom: null };
    }
    const same = await setWithSameCases(tx, definer, set);
    const { entry, toldApart, mix } = set.definition;
    const isSame = same !== null && mix.length === 0;
    return {
      problem: isSame ? problems.sameSet(same.name) : null,
      counts: {
        entry,
        cases: set.cases.length,
        states: set.states,
        total: set.total,
        skip: { weight: set.skip.weight, total: set.total },
        classes: classesOf(set),
      },
      like: tradeSetLike({ entry, toldApart, mix })?.name ?? null,
      algorithmsFrom: isSame ? null : same,
    };
  });
}

function classesOf({ cases, total }: CaseSet): NonNullable<SetPreview['counts']>['classes'] {
  const classes = new Map<string, { angles: number; cases: number; weight: number }>();
  for (const { angles, weight } of cases) {
    const key = `${angles} ${weight}`;
    const class_ = classes.get(key) ?? { angles, cases: 0, weight };
    class_.cases += 1;
    classes.set(key, class_);
  }
  return [...classes.values()]
    .sort((one, other) => other.weight - one.weight || other.angles - one.angles)
    .map(({ angles, cases: n, weight }) => ({ angles, cases: n, prior: { weight, total } }));
}
