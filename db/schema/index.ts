export * from './audit';
export * from './people';
export * from './rooms';
export * from './stop-sets';
