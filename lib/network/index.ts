export { analyse } from './analyse';
export { compile, usedEstimates } from './compile';
export { findTangles } from './tangles';
export type { Analysis, Network, Tangle, Times } from './types';
