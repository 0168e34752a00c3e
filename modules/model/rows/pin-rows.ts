import type { ModelBuilder } from '../model-builder';
import type { PersonWork } from '../work-columns';

/**
 * Pins: a day kept free has sum of work(person, shifts of the day) = 0; a kept shift has sum of
 * work(person, shift, kept post or any) = 1, which no roster meets when the person cannot be on it. Rows
 * pin(person, number). Source: the supervisor.
 */
export function addPinRows(
  builder: ModelBuilder,
  { person, personIndex, byDay }: PersonWork,
): void {
  person.pins.forEach((pin, index) => {
    const works = byDay[pin.dayIndex] ?? [];
    const kept = works.filter(
      ({ shift, postSkillId }) =>
        pin.shiftIndex === null ||
        (shift.index === pin.shiftIndex && [null, postSkillId].includes(pin.postSkillId)),
    );
    const sum = pin.shiftIndex === null ? 0 : 1;
    builder.addRow({
      name: `pin(p${personIndex},${index})`,
      lower: sum,
      upper: sum,
      entries: kept.map(({ column }) => [column, 1]),
    });
  });
}
