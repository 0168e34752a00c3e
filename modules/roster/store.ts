export * from './store-confirmations';
export * from './store-rosters';
export * from './store-run-events';
export * from './store-runs';
export * from './store-shifts';
export * from './store-versions';
