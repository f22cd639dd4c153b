export * from './schema/emitter';
export * from './schema/floor-plan';
export * from './schema/primitives';
export * from './schema/room-file';
export * from './schema/stop-set';
export * from './stop-csv';
export * from './tape';
export * from './times';
