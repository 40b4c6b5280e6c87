import { describe, expect, it } from 'vitest';
import { galaxyLookSchema, initialLook } from '../../src/lib/show/galaxy';
import { lookSettings } from '../../src/routes/(office)/galaxies/tuning/lookSettings';

describe('lookSettings', () => {
	it.each(lookSettings.map((setting) => [setting.range.label, setting] as const))(
		'%s: the form takes what the document takes, and no more',
		(_, { range, get, set }) => {
			for (const end of [range.min, range.max]) {
				const look = set(initialLook, end);
				expect(get(look)).toBe(end);
				expect(galaxyLookSchema.safeParse(look).success, `${end}`).toBe(true);
			}
			for (const beyond of [range.min - 1, range.max + 1]) {
				const refused = galaxyLookSchema.safeParse(set(initialLook, beyond));
				expect(refused.success, `${beyond}`).toBe(false);
			}
			expect(range.sliderMin).toBeGreaterThanOrEqual(range.min);
			expect(range.sliderMax).toBeLessThanOrEqual(range.max);
		}
	);

	it('a count is a whole number', () => {
		const arms = lookSettings.find((setting) => setting.range.label === 'Spiral arms');
		expect(arms?.set(initialLook, 2.6).spiral.arms).toBe(3);
	});
});
