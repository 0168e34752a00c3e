/** Accounts of the demo organisation, offered at sign-in in demo mode only. */
export const demoPassword = 'lantern-day-2027';

/** One account for each role, for the start command and the sign-in page. */
export const demoAccounts = [
  { label: 'Supervisor', email: 'ingrid.solane@ravelmere.example', password: demoPassword },
  { label: 'Staff', email: 'sunniva.adeyo@ravelmere.example', password: demoPassword },
  { label: 'HR', email: 'marcus.tealby@ravelmere.example', password: demoPassword },
  { label: 'Owner', email: 'rowan.keele@ravelmere.example', password: demoPassword },
];
