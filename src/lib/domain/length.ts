export * from './length/units';
export * from './length/entry';
export * from './length/display';
