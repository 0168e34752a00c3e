export { BoardView } from './board-view';
export { Brick } from './brick';
