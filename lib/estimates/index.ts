export { chance, chanceBy, daysFor, tableValue, tableZ, type Chance } from './chance';
export { normalCdf, normalDensity, normalQuantile } from './normal';
export { threePoint, type Moments } from './three-point';
