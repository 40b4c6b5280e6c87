import { describe, expect, it } from 'vitest';
import type { LiveControl, Scene } from '../../src/lib/show/document';
import type { EditionContent } from '../../src/lib/show/edition';
import { findFaults } from '../../src/lib/show/freeze';
import { galaxyId, makeContent, makeScene, uuid } from './support/content';

const control = (overrides: Partial<LiveControl>): LiveControl => ({
	id: uuid(50),
	label: 'Halo',
	target: { kind: 'halo-factor' },
	min: 0,
	max: 2,
	rest: 1,
	...overrides
});
const faultsOf = (scene: Partial<Scene>, change: (content: EditionContent) => void = () => {}) => {
	const content = structuredClone(makeContent([makeScene(1), makeScene(2, scene)]));
	change(content);
	return findFaults(content).filter((fault) => fault.sceneNumber === 2);
};
const parameter = (componentId: string, name: string) =>
	({ kind: 'parameter', componentId, parameter: name }) as const;

describe('findFaults', () => {
	it('finds none in a whole show', () => {
		const whole = makeScene(2, {
			script: 'There {speed at 30 kly}, measured {measured speed at 8 kpc}.',
			comparison: 'halves',
			controls: [
				control({}),
				control({
					id: uuid(51),
					target: parameter('halo', 'scaleRadius'),
					min: 5,
					max: 40,
					rest: 20
				})
			]
		});
		expect(findFaults(makeContent([makeScene(1), whole]))).toEqual([]);
	});

	it('names an empty show', () => {
		expect(findFaults(makeContent([]))).toMatchObject([
			{ sceneId: null, what: 'The show has no scene.' }
		]);
	});

	it('names the scene, what is wrong and what to do', () => {
		const [fault] = faultsOf({ script: '{speed at 30 miles}' });
		expect(fault).toMatchObject({ sceneId: uuid(2), sceneNumber: 2, sceneTitle: 'Scene 2' });
		expect(fault.what).toContain('{speed at 30 miles} in the script cannot be computed');
		expect(fault.remedy).toBe('Change it in the script.');
	});

	it('finds no stars in a galaxy whose only lit component is a point', () => {
		const [fault] = faultsOf({}, (content) => {
			content.galaxies[galaxyId].document.model.components = [
				{ id: 'point', kind: 'point-mass', parameters: { mass: 1e10 }, lit: true }
			];
		});
		expect(fault.what).toContain('no stars to show');
	});

	it('tries the galaxy at the limits of the live controls, not only at rest', () => {
		const heavy = (content: EditionContent) => {
			const halo = content.galaxies[galaxyId].document.model.components.find((c) => !c.lit);
			if (halo) halo.factor = 9;
		};
		expect(faultsOf({}, heavy)).toEqual([]);
		const [fault] = faultsOf({ controls: [control({})] }, heavy);
		expect(fault.what).toContain('cannot be computed');
	});

	it('tells a missing galaxy from an archived one', () => {
		const content = makeContent([
			makeScene(1, { subject: { kind: 'galaxy', galaxyId: uuid(901) } })
		]);
		expect(findFaults(content)[0].what).toContain('not in the library');
		expect(findFaults(content, { [uuid(901)]: 'Old wheel' })[0].what).toContain(
			'“Old wheel” is archived'
		);
	});

	it('refuses a galaxy without lit matter', () => {
		const faults = faultsOf({}, (content) => {
			for (const c of content.galaxies[galaxyId].document.model.components) c.lit = false;
		});
		expect(faults[0].what).toContain('no lit component');
	});

	it('refuses halves that would be the same', () => {
		const dropHalo = (content: EditionContent) => {
			const { model } = content.galaxies[galaxyId].document;
			model.components = model.components.filter((c) => c.lit);
		};
		expect(faultsOf({ comparison: 'halves' }, dropHalo)[0].what).toContain('no unlit component');
		expect(
			faultsOf({ comparison: 'halves', mix: { haloFactor: 0, starFactor: 1 } })[0].what
		).toContain('halo stands at 0');
	});

	it('refuses figures that the dark cannot give, and captions as well', () => {
		const dark = { kind: 'dark', name: '' } as const;
		expect(faultsOf({ subject: dark, script: '{peak speed}' })[0].what).toContain(
			'shows no galaxy'
		);
		const { drawings } = makeScene(1);
		expect(faultsOf({ drawings: { ...drawings, caption: '{speed}' } })[0].remedy).toBe(
			'Change it in the caption.'
		);
	});

	it('refuses controls without a target or outside the physical range', () => {
		const gone = control({ target: parameter('gas', 'mass') });
		expect(faultsOf({ controls: [gone] })[0].what).toContain('does not have');
		const wide = control({
			target: parameter('halo', 'scaleRadius'),
			min: -4,
			max: 40,
			rest: 20
		});
		expect(faultsOf({ controls: [wide] })[0].what).toContain('leave the physical range');
		const dark = { kind: 'dark', name: '' } as const;
		expect(faultsOf({ subject: dark, controls: [control({})] })[0].what).toContain('shows none');
		expect(
			faultsOf({ controls: [control({}), control({ id: uuid(51), label: 'Halo again' })] })[0].what
		).toContain('“Halo again” is the second');
	});

	it('says why a galaxy cannot be computed', () => {
		const faults = faultsOf({}, (content) => {
			content.galaxies[galaxyId].document.model.components[0].parameters.mass = -1;
		});
		expect(faults[0].what).toContain('cannot be computed');
		expect(faults[0].what).toContain('out of range');
	});
});
