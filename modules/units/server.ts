export { newId } from './ids';
