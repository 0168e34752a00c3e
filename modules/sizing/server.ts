export { readLatestSizing, readSizingSheet } from './read-sizing';
export { sizeTeam } from './size-team';
