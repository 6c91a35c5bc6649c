export { checkPlan } from './checker';
export { countCuts, fenceSettings, largestLeftover } from './order';
export { planCuts } from './plan';
