export type { GraphicCallOut } from './call-outs';
export { type CoverDay, columnEdges, drawnDays } from './day-axis';
export { type GraphicState, graphicStateOf } from './drawing';
export { FloorGraphic } from './floor-graphic';
export {
  type CoverWords,
  coverSentence,
  laneVerdict,
  type ShortPlace,
  shortPlaces,
  shortPlaceText,
} from './sentence';
