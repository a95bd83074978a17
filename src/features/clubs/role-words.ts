export * from './words/roles';
