export { bestOfSheet, type BestOfSheet } from './best-sheet';
export { checkPlan } from './checker';
export { cutMost, type MostCut } from './most';
export { countCuts, fenceSetting, fenceSettings, largestLeftover } from './order';
export { planAny, planCuts } from './plan';
