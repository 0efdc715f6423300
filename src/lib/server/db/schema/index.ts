export { sample } from './sample';
