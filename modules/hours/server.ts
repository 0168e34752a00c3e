export { exportHoursCsv } from './export-hours';
export { readHours } from './read-hours';
export { recordWorkedShifts, type WorkedShift } from './store';
export { suggestRange } from './suggest-range';
