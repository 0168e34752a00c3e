/* Reading for the use-cases of other modules, which decide who may see it: no permission check here. */
export { findPersonOfUser, listLeave, listPeople, listSkills } from './store';
