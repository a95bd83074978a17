export * from './words/rules';
