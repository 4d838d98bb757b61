export { analyse } from './analyse';
export { compile, usedEstimates } from './compile';
export { prepareEffects, type Effect, type FinishEffects } from './effects/effects';
export { findTangles } from './tangles';
export type { Analysis, Network, Tangle, Times } from './types';
