import type { RunCommand } from '../show/playback';

/** Name of a press, for "not reached yet". */
export const commandWords: Record<RunCommand['kind'], string> = {
	begin: 'Begin',
	advance: 'Next',
	back: 'Back',
	jump: 'Jump',
	hold: 'Hold',
	'go-on': 'Go on',
	rest: 'Rest picture',
	resume: 'Picture back',
	control: 'Live control',
	end: 'End'
};
