import { type DemoLeave, type DemoPerson, hours } from './team-data';

type Row = readonly [name: string, skills: string, weeklyHours: number, limit?: 'no Nights'];

/** The home skill stands first and sets the pay. */
const rows: readonly Row[] = [
  ['Maren Oduya', 'Vet', 40],
  ['Tobias Lindrao', 'Vet', 40],
  ['Ysolde Amankar', 'Vet', 40],
  ['Pavel Dristan', 'Vet', 32],
  ['Noor Haldane', 'Vet', 40],
  ['Ciaran Vought', 'Vet', 24, 'no Nights'],
  ['Ione Baptisto', 'Nurse', 40],
  ['Kwabena Tull', 'Nurse', 40],
  ['Lucja Mirov', 'Nurse', 40],
  ['Hana Quill', 'Nurse', 40],
  ['Desmond Ferlow', 'Nurse', 40],
  ['Anouk Tessaly', 'Nurse', 24, 'no Nights'],
  ['Ravi Thornby', 'Nurse, Desk', 40],
  ['Sunniva Adeyo', 'Nurse, Ward', 40],
  ['Bram Okell', 'Ward', 40],
  ['Petra Vanholt', 'Ward, Nurse', 40],
  ['Jun Marisco', 'Ward, Nurse', 32],
  ['Elspeth Nakano', 'Ward', 40, 'no Nights'],
  ['Mateo Grindle', 'Ward', 32],
  ['Farah Wexcombe', 'Desk, Ward', 40, 'no Nights'],
  ['Odile Brandosei', 'Desk', 32],
  ['Timur Ashgrove', 'Desk', 40],
  ['Gwen Palliato', 'Desk', 24],
  ['Zuri Hallam', 'Desk', 24],
];

const payCentsPerHour: Readonly<Record<string, number>> = {
  Vet: 3800,
  Nurse: 2500,
  Ward: 1900,
  Desk: 1800,
};

/** Hours of a period may fall 16 h short of the contract and go 24 h beyond it. */
export const ravelmerePeople: readonly DemoPerson[] = rows.map(
  ([name, skillList, weeklyHours, limit], index) => {
    const skills = skillList.split(', ');
    return {
      name,
      staffNumber: String(1001 + index),
      skills,
      contract: {
        weeklyMinutes: hours(weeklyHours),
        underMinutes: hours(16),
        overtimeMinutes: hours(24),
        payCentsPerHour: payCentsPerHour[skills[0] ?? ''] ?? 0,
        paidBy: 'contract',
        mayWorkNights: limit !== 'no Nights',
      },
    };
  },
);

/** Tobias Lindrao's two days take Nights away from a team of vets that is short already. */
export const ravelmereLeave: readonly DemoLeave[] = [
  { period: 'running', name: 'Kwabena Tull', from: 9, to: 11 },
  { period: 'running', name: 'Odile Brandosei', from: 22, to: 25 },
  { period: 'draft', name: 'Timur Ashgrove', from: 1, to: 3 },
  { period: 'draft', name: 'Hana Quill', from: 8, to: 12 },
  { period: 'draft', name: 'Tobias Lindrao', from: 11, to: 12 },
  { period: 'draft', name: 'Maren Oduya', from: 15, to: 19 },
  { period: 'draft', name: 'Mateo Grindle', from: 22, to: 24 },
  { period: 'draft', name: 'Lucja Mirov', from: 26, to: 28 },
];
