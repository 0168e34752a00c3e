export { defaultInput, type SizingSetting } from './default-input';
export { expandLines, type SizingSource } from './expand-lines';
export { explainBound, explainShortage } from './explain-answer';
export type { Sizing } from './sizing';
export {
  type SizingInput,
  type SizingLine,
  sizingInputSchema,
  sizingLineSchema,
} from './sizing-input';
export type { SizingSheet } from './sizing-sheet';
