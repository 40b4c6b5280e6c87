export { editionsToRun, type EditionToRun } from './editionsToRun';
export { eventsAfter } from './runEvents';
export { listRuns, openRunOf, readRun, readRunEdition, type Run, type RunListed } from './readRuns';
export { runLog, type ActEntry, type RunLog, type SceneEntry } from './runLog';
export { saveLog } from './saveLog';
export { sendCommand, type CommandAnswer } from './sendCommand';
export { startRun } from './startRun';
