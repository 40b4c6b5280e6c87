export { playbackAt, type Playback } from './playback';
export { rehearsalEvents, sceneEvents } from './rehearsal';
export { runCommandSchema, type RunCommand, type RunEvent } from './messages';
export type { MotionStretch, PlaybackState } from './state';
