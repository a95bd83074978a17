export * from './words/place';
