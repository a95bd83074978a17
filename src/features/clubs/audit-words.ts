export * from './words/audit-text';
