export { recordAudit } from './audit';
export { changeMember, listMembers } from './members';
export { hashPassword } from './password';
export { findActor, longestMilliseconds, signIn, signOut } from './session';
export { findTeam } from './store';
export { listTeams, requireTeam } from './teams';
