export { UnreadableFile, type UnreadableCode } from './errors';
export { readSheets } from './read-sheets';
