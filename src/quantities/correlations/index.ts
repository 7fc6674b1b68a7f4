export * from './bed.ts';
export * from './duct-heat.ts';
export * from './entry.ts';
export * from './friction.ts';
export * from './passage-friction.ts';
export { between, type Table } from './table.ts';
