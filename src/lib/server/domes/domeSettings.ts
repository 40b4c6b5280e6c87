import { z } from 'zod';

/** Pixels across the film: diameters usual in the dome trade. */
export const filmSizes = [720, 1024, 1536, 2048, 3200, 3600, 4096, 8192] as const;
export const painterChoices = ['auto', 'plain', 'webgl'] as const;

const number = (what: string, min: number, max: number, unit: string) =>
	z.coerce
		.number(`${what} must be a number.`)
		.min(min, `${what} must be at least ${min} ${unit}.`)
		.max(max, `${what} must be at most ${max} ${unit}.`);

/** What a technician says about a dome; numbers may come as a form's text. */
export const domeSettingsSchema = z.object({
	name: z.string().trim().min(1, 'Give the dome a name.').max(80, 'At most 80 characters.'),
	diameterMetres: number('The diameter', 2, 60, 'metres'),
	seats: number('The number of seats', 0, 2000, 'seats').int('Seats come in whole numbers.'),
	apertureDegrees: number('The aperture', 90, 230, 'degrees'),
	tiltDegrees: number('The tilt', 0, 45, 'degrees'),
	filmSize: z.coerce
		.number()
		.refine((n) => (filmSizes as readonly number[]).includes(n), 'Choose a size from the list.'),
	painter: z.enum(painterChoices, 'Choose a painter from the list.')
});
export type DomeSettings = z.infer<typeof domeSettingsSchema>;

export const initialDomeSettings: DomeSettings = {
	name: '',
	diameterMetres: 10,
	seats: 60,
	apertureDegrees: 180,
	tiltDegrees: 0,
	filmSize: 2048,
	painter: 'auto'
};
