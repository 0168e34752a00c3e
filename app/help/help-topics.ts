export interface Topic {
  readonly word: string;
  readonly meaning: string;
}

/** How the drawings are read. */
export const drawings: readonly Topic[] = [
  {
    word: 'Thick line',
    meaning:
      'The floor: the least people on duty at each hour. It is a line, not a storey or a ward.',
  },
  {
    word: 'Filled, hatched, outlined',
    meaning:
      'Filled up to the line is covered. Hatched is short: somebody is still missing. Outlined above the line is spare. Skills are counted one by one, so a spare nurse does not hide a missing vet.',
  },
  {
    word: 'Brick',
    meaning:
      'One shift of one person, at its true hours inside the day. It darkens with lateness and carries the letter of its shift kind. A dashed outline means that the person works in a second skill.',
  },
  {
    word: 'Day column',
    meaning:
      'A column runs from the start of the earliest shift to the same time next day, so a night belongs to the day on which it starts.',
  },
  {
    word: 'Line between two slanted ticks',
    meaning: 'A span, for example leave from its first to its last day.',
  },
  {
    word: 'Bar with a thick tick',
    meaning:
      'Hours against the contract, which is the tick. Filled are hours up to it, outlined are hours beyond it.',
  },
];

/** What our words mean, in the order in which a newcomer meets them. */
export const words: readonly Topic[] = [
  {
    word: 'Floor',
    meaning:
      'The least people on duty: how many, of which skill, over which hours. A firm floor must hold; a wished one may be left short at a price for each missing hour.',
  },
  {
    word: 'Seated and shared floors',
    meaning:
      'A seated floor counts each person once, in the post they hold on that shift. A shared floor counts everybody on duty who has the skill.',
  },
  {
    word: 'Cover, short, spare',
    meaning:
      'Cover is the people on duty. Short is what is missing to the floor, spare what is above it.',
  },
  {
    word: 'Shift kind',
    meaning: 'A named pattern of start, end and unpaid break, for example Early 06:00–14:00.',
  },
  {
    word: 'Post',
    meaning: 'The skill in which a person counts while on a shift.',
  },
  {
    word: 'Hours needed, hours available',
    meaning:
      'The hours that the floors take, against the hours that contracts give after leave. Enough hours are necessary, not sufficient: rest and leave decide day by day.',
  },
  {
    word: 'Sizing',
    meaning:
      'How many people, on which shift patterns, the floors take at least cost, before anybody is named.',
  },
  {
    word: 'Price of a floor',
    meaning: 'What one person more on that floor would cost.',
  },
  {
    word: 'Roster',
    meaning:
      'The plan of one team for one period: a draft first, a numbered version once it is published, closed in the end.',
  },
  {
    word: 'Run',
    meaning:
      'One computation of a roster. Stage one finds how far the floors can be held; stage two finds the cheapest roster that holds them so far. You can stop it at any time and keep the best roster found.',
  },
  {
    word: 'Proof',
    meaning:
      'What comes with every roster of a run: its cost, the least that any roster can cost, the gap between the two, and the rules checked once more by code that shares nothing with the solver.',
  },
  {
    word: 'Pin',
    meaning: 'Keeps a shift where it is when a run makes the roster anew.',
  },
  {
    word: 'Publish',
    meaning:
      'Makes the draft a numbered version and sends each person their own shifts by e-mail, with a file for their calendar.',
  },
  {
    word: 'Confirm',
    meaning:
      'Says that you have seen your shifts. You can still ask your supervisor for a change, and the shifts stand whether or not you confirm.',
  },
  {
    word: 'Planned and worked hours',
    meaning:
      'Planned hours are those of published rosters, worked hours those that were recorded. Night, weekend and holiday hours overlap, so one hour can stand in several columns.',
  },
];

/** Who uses what. */
export const roles: readonly Topic[] = [
  { word: 'Supervisor', meaning: 'Sets floors and shift kinds of the team, runs, publishes.' },
  { word: 'Staff', meaning: 'See their own shifts and month, and confirm the roster.' },
  { word: 'HR', meaning: 'Reads rosters and hours, takes hours out as a file; changes no roster.' },
  {
    word: 'Owner',
    meaning: 'Does all that a supervisor does, reads hours, and sets who may do what.',
  },
];

/** What the reader must weigh. */
export const cautions: readonly string[] = [
  'Working-time and pay rules differ by country, sector and agreement. Floorwright gives no legal advice: local law, agreements and licensed practice come first.',
  'Fatigue can injure. Long runs of nights, short rest and long shifts are a danger even where a rule set allows them.',
  'Floors that protect life, such as ratios of carers, lifeguards or crew, must come from the authority or the licensed person responsible. Floorwright lowers none by itself.',
];
