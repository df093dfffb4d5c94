export * from './accounts';
export * from './errors';
export * from './health';
export * from './paths';
export * from './reports';
export * from './takes';
