export * from './accounts';
export * from './errors';
export * from './events';
export * from './health';
export * from './paths';
export * from './reports';
export * from './shares';
export * from './takes';
