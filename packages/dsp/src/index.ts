export * from './facts';
export * from './trackSource';
