export * from './words/sits';
