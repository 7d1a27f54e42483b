/** Figures of members and teams: calibration, dealt recall and its error, intervals, ranks. Pure. */
export {
  CALIBRATION_DAYS,
  type Calibration,
  type CalibrationAnswer,
  calibrated,
  logitCalibration,
  NO_CALIBRATION,
} from './calibration.ts';
export {
  type DealtCase,
  type DealtSums,
  dealtFromSums,
  dealtRecall,
  dealtSums,
  type Estimate,
  interval,
  lowerBound,
  periodMean,
} from './dealt-recall.ts';
export { CONFIDENCE, jeffreys, wilson } from './proportions.ts';
export { rank } from './rank.ts';
export { TEAM_SHRINKAGE, type TeamFigure, teamFigure } from './team.ts';
