export * from './condition-types';
export * from './ground-types';
export * from './verdict-types';
