export {
  type DetectedColumn,
  type DetectedSheet,
  type Detection,
  detectMatching,
  type MatchingError,
  type MatchingForm,
  matchingFrom,
  UnmatchedColumns,
} from './columns';
export { type UnreadableCode, UnreadableFile } from './errors';
export { readSheets } from './read-sheets';
export { readActivityList, type SampleRow, sampleRows } from './activity-list';
