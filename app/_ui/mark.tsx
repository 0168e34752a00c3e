/** Our mark: a floor line that steps up over its courses. Decoration; the name stands beside it. */
export function Mark({ className = 'size-6' }: { readonly className?: string }) {
  return (
    <svg viewBox="0 0 32 32" className={className} aria-hidden="true">
      <path className="fill-stone" d="M2 28V17H12V12H22V7H30V28Z" />
      <path className="fill-none stroke-paper" strokeWidth="1.5" d="M2 22.5H30M12 17H30" />
      <path className="fill-none stroke-ink" strokeWidth="3.5" d="M1 17H12V12H22V7H31" />
      <path className="fill-none stroke-ink" strokeWidth="2" d="M1 28H31" />
    </svg>
  );
}
