interface Props<T> {
  /** What is chosen, for screen readers. */
  readonly label: string;
  readonly choices: readonly { readonly value: T; readonly label: string }[];
  readonly value: T;
  readonly onChange: (value: T) => void;
  readonly className?: string;
}

/** A few choices side by side, one of them in force. */
export function ChoiceBar<T extends string | number>(props: Props<T>) {
  const { label, choices, value, onChange, className = '' } = props;
  return (
    <fieldset
      aria-label={label}
      className={`flex border-[1.25px] border-ink print:hidden ${className}`}
    >
      {choices.map((choice) => (
        <button
          key={choice.value}
          type="button"
          aria-pressed={choice.value === value}
          onClick={() => onChange(choice.value)}
          className={`min-h-7 flex-1 px-3 text-second font-[640] whitespace-nowrap phone:min-h-11 ${
            choice.value === value ? 'bg-ink text-paper' : 'hover:bg-recess'
          }`}
        >
          {choice.label}
        </button>
      ))}
    </fieldset>
  );
}
