import { inTransaction } from '../../db/client';
import type { Actor } from '../access';
import { recordAudit, requireTeam } from '../access/server';
import { listSkills } from '../people/server';
import {
  type FieldError,
  type Outcome,
  ok,
  refuse,
  type ShiftKindId,
  type SkillId,
  type TeamId,
} from '../units';
import type { ShiftKind, ShiftKindInput } from './shift-kind';
import {
  type CheckedShiftKind,
  findShiftKind,
  insertShiftKind,
  readShiftKinds,
  setRetired,
  updateShiftKind,
} from './store-shift-kinds';

/** Adds a shift kind to a team. */
export function addShiftKind(
  actor: Actor,
  teamId: TeamId,
  input: ShiftKindInput,
): Outcome<ShiftKind> {
  const team = requireTeam(actor, 'floors.write', teamId);
  if (!team.ok) return team;
  const checked = checkShiftKind(teamId, input, null);
  if (!checked.ok) return checked;
  return inTransaction(() => {
    const id = insertShiftKind(teamId, checked.value);
    recordAudit({ actor, teamId, action: 'shift-kind.add', subjectId: id, detail: { ...input } });
    return ok({ ...checked.value, id, teamId, isRetired: false });
  });
}

/** Replaces a shift kind from the next run on; rosters keep the instants they were planned with. */
export function changeShiftKind(
  actor: Actor,
  kindId: ShiftKindId,
  input: ShiftKindInput,
): Outcome<ShiftKind> {
  const found = requireShiftKind(actor, kindId);
  if (!found.ok) return found;
  const before = found.value;
  const { teamId } = before;
  const checked = checkShiftKind(teamId, input, kindId);
  if (!checked.ok) return checked;
  return inTransaction(() => {
    updateShiftKind(kindId, checked.value);
    const detail = { before, after: input };
    recordAudit({ actor, teamId, action: 'shift-kind.change', subjectId: kindId, detail });
    return ok({ ...before, ...checked.value });
  });
}

/** Offers a shift kind no more; it stays on old rosters and its name and letter are free again. */
export function retireShiftKind(actor: Actor, kindId: ShiftKindId): Outcome<undefined> {
  const found = requireShiftKind(actor, kindId);
  if (!found.ok) return found;
  const { teamId, name } = found.value;
  return inTransaction(() => {
    setRetired(kindId);
    const detail = { name };
    recordAudit({ actor, teamId, action: 'shift-kind.retire', subjectId: kindId, detail });
    return ok(undefined);
  });
}

function requireShiftKind(actor: Actor, kindId: ShiftKindId): Outcome<ShiftKind> {
  const kind = findShiftKind(kindId);
  const team = kind ? requireTeam(actor, 'floors.write', kind.teamId) : null;
  if (team && !team.ok && team.error.code !== 'not-found') return team;
  if (!kind || !team?.ok) {
    return refuse('not-found', 'There is no such shift kind among those of your teams.');
  }
  if (kind.isRetired) {
    return refuse('conflict', `${kind.name} was retired. Add a new shift kind instead.`);
  }
  return ok(kind);
}

function checkShiftKind(
  teamId: TeamId,
  input: ShiftKindInput,
  ownId: ShiftKindId | null,
): Outcome<CheckedShiftKind> {
  const others = readShiftKinds(teamId).filter(({ id, isRetired }) => id !== ownId && !isRetired);
  const known = new Map<string, SkillId>(listSkills(teamId).map(({ id }) => [id, id]));
  const skillIds = input.skillIds?.flatMap((id) => known.get(id) ?? []) ?? null;
  const fields = [
    ...takenFields(input, others),
    ...(input.skillIds ?? []).flatMap((id, index) =>
      known.has(id)
        ? []
        : [{ path: `skillIds.${index}`, message: 'Choose skills of this team only.' }],
    ),
  ];
  return fields.length > 0
    ? refuse('invalid', 'The shift kind cannot be saved like this.', fields)
    : ok({ ...input, skillIds: skillIds && [...new Set(skillIds)] });
}

/** Names and letters are compared without regard to capitals: both must be told apart when read aloud. */
function takenFields(input: ShiftKindInput, others: readonly ShiftKind[]): FieldError[] {
  const isSame = (one: string, other: string) => one.toLowerCase() === other.toLowerCase();
  const fields: FieldError[] = [];
  if (others.some(({ name }) => isSame(name, input.name))) {
    fields.push({ path: 'name', message: `${input.name} is taken. Choose another name.` });
  }
  const holder = others.find(({ letter }) => isSame(letter, input.letter));
  if (holder) {
    const message = `${input.letter} stands for ${holder.name}. Choose another letter.`;
    fields.push({ path: 'letter', message });
  }
  return fields;
}
