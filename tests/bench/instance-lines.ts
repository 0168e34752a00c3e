const sectionNames = [
  'SECTION_HORIZON',
  'SECTION_SHIFTS',
  'SECTION_STAFF',
  'SECTION_DAYS_OFF',
  'SECTION_SHIFT_ON_REQUESTS',
  'SECTION_SHIFT_OFF_REQUESTS',
  'SECTION_COVER',
] as const;
export type SectionName = (typeof sectionNames)[number];

/** A fault of an instance file; the message names the file, and the line and section where there is one. */
export class InstanceError extends Error {
  override readonly name = 'InstanceError';
}

/** One line of data: its fields, read one by one with a check of each. */
export class InstanceLine {
  readonly #file: string;
  readonly #number: number;
  readonly #section: SectionName;
  readonly #fields: readonly string[];

  constructor(file: string, number: number, section: SectionName, text: string) {
    this.#file = file;
    this.#number = number;
    this.#section = section;
    this.#fields = text.split(',').map((field) => field.trim());
  }

  /** Refuses a line with fewer or more fields. */
  expectFields(names: readonly string[]): void {
    const count = this.#fields.length;
    if (count === names.length) return;
    this.fail(`${count} fields instead of ${names.length} (${names.join(', ')}).`);
  }

  /** The text of a field, '' when the line is shorter. */
  text(position: number): string {
    return this.#fields[position] ?? '';
  }

  texts(from: number): readonly string[] {
    return this.#fields.slice(from);
  }

  /** The parts of a field that `|` separates, without empty ones. */
  parts(position: number): string[] {
    return this.text(position)
      .split('|')
      .map((part) => part.trim())
      .filter((part) => part !== '');
  }

  /** A whole number that is not negative, in a field. */
  whole(position: number, name: string, least = 0): number {
    return this.readWhole(this.text(position), name, least);
  }

  /** A whole number that is not negative, in any text of the line. A published file has "-0" too. */
  readWhole(text: string, name: string, least = 0): number {
    const value = /^(-0|\d{1,9})$/.test(text) ? Math.abs(Number(text)) : null;
    if (value === null) this.fail(`${name} is "${text}", which is no whole number.`);
    if (value < least) this.fail(`${name} is ${value}; the least is ${least}.`);
    return value;
  }

  fail(sentence: string): never {
    throw new InstanceError(`${this.#file}, line ${this.#number}, ${this.#section}: ${sentence}`);
  }
}

/** The lines of data by section. Comments start with #; empty lines count for nothing. */
export function readSections(
  text: string,
  file: string,
): ReadonlyMap<SectionName, readonly InstanceLine[]> {
  const sections = new Map<SectionName, InstanceLine[]>();
  let current: { readonly name: SectionName; readonly lines: InstanceLine[] } | null = null;
  for (const [index, raw] of text.split(/\r?\n/).entries()) {
    const line = raw.trim();
    const place = `${file}, line ${index + 1}`;
    if (line === '' || line.startsWith('#')) continue;
    if (line.startsWith('SECTION_')) {
      const name = sectionNames.find((known) => known === line);
      if (!name) throw new InstanceError(`${place}: ${line} is no section of this format.`);
      if (sections.has(name)) throw new InstanceError(`${place}: ${name} stands here twice.`);
      current = { name, lines: [] };
      sections.set(name, current.lines);
    } else if (current) {
      current.lines.push(new InstanceLine(file, index + 1, current.name, line));
    } else {
      throw new InstanceError(`${place}: "${line.slice(0, 40)}" stands before the first section.`);
    }
  }
  return sections;
}
