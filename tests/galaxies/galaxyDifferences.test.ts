import { describe, expect, it } from 'vitest';
import { galaxy } from '../show/support/content';
import { galaxyDifferences } from '../../src/routes/(office)/galaxies/tuning/galaxyDifferences';

describe('galaxyDifferences', () => {
	it('is empty for the same galaxy, read anew', () => {
		expect(galaxyDifferences(galaxy, structuredClone(galaxy))).toEqual([]);
	});

	it('names every place with both values', () => {
		const [bulge, disc, halo] = galaxy.model.components;
		const theirs = {
			...galaxy,
			name: 'Other',
			sources: '',
			look: { ...galaxy.look, dust: 0 },
			model: {
				components: [
					{ ...bulge, lit: false },
					{ ...halo, parameters: { ...halo.parameters, density: 9e6 } }
				]
			}
		};
		expect(disc.id).toBe('disc');
		expect(galaxyDifferences(galaxy, theirs)).toEqual([
			{ what: 'Name', mine: 'Test wheel', theirs: 'Other' },
			{ what: 'bulge: matter', mine: 'lit', theirs: 'unlit' },
			{ what: 'disc', mine: 'is there', theirs: 'removed' },
			{ what: 'halo: density', mine: '8000000', theirs: '9000000' },
			{ what: 'Look', mine: 'yours', theirs: 'theirs, different' },
			{ what: 'Sources', mine: 'Made for tests.', theirs: 'empty' }
		]);
	});
});
