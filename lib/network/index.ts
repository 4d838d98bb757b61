export type { Analysis, Network, Tangle, Times } from './types';
