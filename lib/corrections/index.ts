export {
  applyCorrections,
  cellReader,
  contentAt,
  type CorrectionEvent,
  type Corrections,
  editsOf,
  type FoundCell,
} from './apply';
export { type CheckedEdits, checkHandEdits, type EditProblem, type HandEdit, SHEET_LIMITS } from './by-hand';
export { type Adoptable, type Adopted, type Adoption, composeAdoption, type Skipped } from './compose';
export { contentOf } from './content';
export { applyItems, type AppliedItems, itemsOf } from '@/lib/schedule/link-items';
export { replay, type Replay, withdraw } from './replay';
