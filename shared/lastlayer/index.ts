export { AUFS, type Auf, act, canonical, inverse, mirror, product } from './action.ts';
export {
  ASPECTS,
  type Aspect,
  ENTRIES,
  type Entry,
  EVERY_ENTRY,
  entryFixing,
  fixedBy,
  inOrder,
  isAspect,
  isEntry,
  isEntryState,
  isSolvedIn,
  seenThrough,
} from './aspects.ts';
export { burnsideOf, type FixedStates } from './burnside.ts';
export {
  type CaseLine,
  type Finding,
  type ReadLine,
  type ReadLines,
  readCaseLines,
} from './case-lines.ts';
export { buildCaseSet, type CaseOfSet, type CaseSet, caseSet } from './case-set.ts';
export { OFFERED_WHOLE } from './clusters.ts';
export { type Confusable, type ConfusableOptions, confusableWith } from './confusable.ts';
export { type CaseCount, countCases } from './counting.ts';
export { type Difference, differsAt } from './differs-at.ts';
export {
  type Cell,
  casesDrawn,
  colouringOf,
  type Drawing,
  type DrawnCase,
  EMPTY_DRAWING,
  painted,
  readDrawing,
  topColour,
  writeDrawing,
} from './drawing.ts';
export { type DrawingProblem, drawingProblems } from './drawing-problems.ts';
export { type Facelets, type Frame, faceletsAfter, playAlgorithm } from './facelets.ts';
export { type Fraction, fraction } from './fractions.ts';
export { type Ledger, type LedgerClass, type LedgerCount, ledgerOf } from './ledger.ts';
export { type LostBy, lostBy } from './lost-by.ts';
export { type EntryShare, MOST_PARTS, meetOf } from './mix.ts';
export { countMoves, type MoveCounts, moveCounts } from './move-counts.ts';
export type { Move } from './moves.ts';
export { nearestView } from './nearest-view.ts';
export { type Expander, type ParsedAlgorithm, parseAlgorithm } from './notation.ts';
export { type Reading, readAlgorithm } from './reading.ts';
export {
  hasInverse,
  inverseOf,
  mirrorInverseOf,
  orientationOf,
  permutationOf,
  stabiliser,
} from './relations.ts';
export { requireDefinition } from './requirements.ts';
export { type Look, type TwoLookRoute, twoLookRoutes } from './routes.ts';
export { cancelledKey, sameAlgorithm } from './same-algorithm.ts';
export { AlgorithmSyntaxError } from './scanner.ts';
export type { Holding } from './seat-codes.ts';
export { CASE_SETS, type CaseSetDefinition, caseKey, openIn, type Structure, tradeSetLike } from './sets.ts';
export { rightAufsAfter, rightAufsBefore, type Solves, solvesCase } from './solving.ts';
export { type LastLayerState, STATES, stateAt, stateIndex } from './state.ts';
export { type Grouped, groupsOf, type SubsetChoice, subsetOf } from './subset.ts';
