export * from './sizing-input';
