import { drawnDays } from '@/app/_ui/floor-graphic';
import { readProof } from '@/modules/proof';
import type { Board, BoardCell, BoardKind, BoardPerson } from '@/modules/roster';
import type { LocalDate, PersonId, SkillId } from '@/modules/units';

const dayMinutes = 1440;

const kind = (
  id: 'early' | 'night',
  name: string,
  startMinute: number,
  tone: 0 | 3,
): BoardKind => ({
  id: `knd_${id}`,
  name,
  letter: name.slice(0, 1),
  startMinute,
  endMinute: startMinute + 480,
  isNight: tone === 3,
  tone,
});

const early = kind('early', 'Early', 420, 0);
const night = kind('night', 'Night', 1380, 3);

function person(id: PersonId, name: string, skillIds: readonly SkillId[]): BoardPerson {
  return {
    id,
    name,
    skillIds,
    contractMinutes: 9600,
    plannedMinutes: 480,
    creditMinutes: 0,
    overtimeMinutes: 0,
    nights: 0,
    weekends: 0,
    mayWorkNights: true,
    leave: [],
    confirmedAtUtc: null,
  };
}

/** A shift on a day counted from Monday 1 February 2027. */
export function cell(
  personId: PersonId,
  dayIndex: number,
  shift: 'early' | 'night',
  postSkillId: SkillId,
): BoardCell {
  const { id, startMinute, endMinute } = shift === 'early' ? early : night;
  const date = `2027-02-0${dayIndex + 1}`;
  return {
    personId,
    date: dayIndex < 0 ? '2027-01-31' : date,
    kindId: id,
    postSkillId,
    startMinute: dayIndex * dayMinutes + startMinute,
    endMinute: dayIndex * dayMinutes + endMinute,
    paidMinutes: 480,
    isPinned: false,
  };
}

/** Two vets and a ward carer who is a nurse on Tuesday, in the week of 1 to 7 February 2027. */
export function smallBoard(changes: Partial<Board> = {}): Board {
  return {
    rosterId: 'ros_1',
    teamId: 'tea_1',
    teamName: 'Hospital',
    organisationName: 'Ravelmere',
    startsOn: '2027-02-01',
    endsOn: '2027-02-07',
    zone: 'Europe/Berlin',
    currency: 'EUR',
    today: '2027-02-03',
    dayStartsAtMinute: 420,
    version: {
      id: 'ver_1',
      number: 1,
      publishedAtUtc: null,
      publishedByName: null,
      confirmBy: null,
    },
    days: drawnDays('2027-02-01', '2027-02-07', 'Europe/Berlin'),
    skills: [
      { id: 'ski_vet', name: 'Vet' },
      { id: 'ski_nurse', name: 'Nurse' },
      { id: 'ski_ward', name: 'Ward' },
    ],
    kinds: [early, night],
    people: [
      person('per_noor', 'Noor Haldane', ['ski_vet']),
      person('per_pavel', 'Pavel Dristan', ['ski_vet']),
      person('per_petra', 'Petra Vanholt', ['ski_ward', 'ski_nurse']),
    ],
    cells: [cell('per_noor', 0, 'early', 'ski_vet'), cell('per_petra', 1, 'night', 'ski_nurse')],
    cellsBefore: [cell('per_pavel', -1, 'night', 'ski_vet')],
    lanes: [],
    proof: null,
    mayEdit: true,
    maySeePay: true,
    noticeWarning: null,
    notes: [],
    activeRunId: null,
    isRunCurrent: false,
    run: null,
    ...changes,
  };
}

/** What a re-check found, with broken rules of one person and nothing else. */
export function proofWith(
  breaches: readonly { readonly personId: PersonId; readonly date: LocalDate }[],
): Board['proof'] {
  return readProof({
    costCents: 0,
    contractPayCents: 0,
    premiumPayCents: 0,
    overtimePayCents: 0,
    overtimeMinutes: 0,
    wishedShortageCents: 0,
    shortageMinutes: 0,
    wishedShortageMinutes: 0,
    shortages: [],
    breaches: breaches.map((breach) => ({
      ...breach,
      rule: 'rest',
      sentence: 'Rest is 8 h; the rule is 11 h.',
    })),
    checked: [],
    people: [],
  });
}
