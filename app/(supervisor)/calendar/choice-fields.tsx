import { type Choice, choicesIn } from '@/app/_ui/calendar/choose-entries';
import { SelectField } from '@/app/_ui/field';
import type { CalendarEntry } from '@/modules/roster';

interface Props {
  readonly entries: readonly CalendarEntry[];
  readonly choice: Choice;
  readonly onChoose: (choice: Choice) => void;
}

/** Narrows the calendar to a person, a post, or both. */
export function ChoiceFields({ entries, choice, onChoose }: Props) {
  const { people, posts } = choicesIn(entries);
  const person = people.find(({ id }) => id === choice.personId);
  return (
    <>
      <SelectField
        label="Person"
        value={choice.personId ?? ''}
        onChange={({ target }) =>
          onChoose({
            ...choice,
            personId: people.find(({ id }) => id === target.value)?.id ?? null,
          })
        }
      >
        <option value="">Everybody</option>
        {people.map(({ id, name }) => (
          <option key={id} value={id}>
            {name}
          </option>
        ))}
        {choice.personId && !person ? (
          <option value={choice.personId}>No shifts on these days</option>
        ) : null}
      </SelectField>
      <SelectField
        label="Post"
        value={choice.skillName ?? ''}
        onChange={({ target }) => onChoose({ ...choice, skillName: target.value || null })}
      >
        <option value="">Every post</option>
        {[...new Set([...posts, ...(choice.skillName ? [choice.skillName] : [])])].map((post) => (
          <option key={post}>{post}</option>
        ))}
      </SelectField>
    </>
  );
}
