export {
  clearFloorDate,
  continueFloors,
  setFloorDate,
  setFloorNeeds,
} from './edit-floor-needs';
export { addFloor, changeFloor, removeFloor } from './edit-floors';
export { addShiftKind, changeShiftKind, retireShiftKind } from './edit-shift-kinds';
export { listHolidays, listShiftKinds, readCoverage } from './read-coverage';
/** The floors of a team, for the use-cases of other modules. No permission check. */
export { listFloors } from './store';
