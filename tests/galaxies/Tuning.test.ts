import { describe, expect, it } from 'vitest';
import { componentKinds } from '../../src/lib/dynamics';
import { galaxyDocumentSchema } from '../../src/lib/show/galaxy';
import { galaxy } from '../show/support/content';
import { makeTuning } from './support';

const halo = (document: typeof galaxy) => document.model.components.find((c) => c.id === 'halo');

describe('Tuning', () => {
	it('answers a changed halo in its model and curves, and undo brings the speeds back', () => {
		const { tuning, documents } = makeTuning();
		const before = tuning.model.circularVelocity(20);
		const dense = { parameters: { density: 3.2e7, scaleRadius: 20 } };
		tuning.changeComponent('halo', dense, 'density');
		const after = tuning.model.circularVelocity(20);
		expect(after - before, `${before} to ${after} km/s`).toBeGreaterThan(50);
		const total = tuning.curves.find((curve) => curve.role === 'total');
		const end = tuning.radii.length - 1;
		const expected = tuning.model.circularVelocity(tuning.radii[end]);
		expect(total?.speeds[end]).toBe(expected);
		expect(halo(documents[0])?.parameters.density).toBe(3.2e7);
		tuning.undo();
		expect(tuning.model.circularVelocity(20)).toBe(before);
		tuning.redo();
		expect(tuning.model.circularVelocity(20)).toBe(after);
	});

	it('one drag of a slider is one step back', () => {
		const { tuning } = makeTuning();
		for (const density of [9e6, 1e7, 1.1e7]) {
			const parameters = { density, scaleRadius: 20 };
			tuning.changeComponent('halo', { parameters }, 'density', 'density');
		}
		tuning.undo();
		expect(tuning.document).toBe(galaxy);
	});

	it('every kind can be added as it is met and saved; a removed one comes back by undo', () => {
		const { tuning, told } = makeTuning();
		for (const info of componentKinds) tuning.add(info);
		const { components } = tuning.document.model;
		expect(components).toHaveLength(galaxy.model.components.length + componentKinds.length);
		expect(galaxyDocumentSchema.parse(tuning.document)).toEqual(tuning.document);
		const [first] = components;
		tuning.remove(first);
		expect(tuning.document.model.components).not.toContain(first);
		expect(told.at(-1)).toBe('Removed “bulge”');
		tuning.undo();
		expect(tuning.document.model.components[0]).toBe(first);
	});

	it('where it may not be edited, everything can be tried and nothing is told', () => {
		const { tuning, documents } = makeTuning({ mayEdit: false });
		expect(tuning.touched).toBe(false);
		tuning.changeComponent('halo', { lit: true }, 'matter');
		expect(tuning.touched).toBe(true);
		expect(tuning.model.unlit().circularVelocity(8)).toBe(0);
		expect(documents).toEqual([]);
	});

	it('the read-outs are for the pointer, and where it has left, for the resting line', () => {
		const { tuning } = makeTuning();
		tuning.looked = 3;
		expect(tuning.reading).toBe(3);
		tuning.looked = null;
		expect(tuning.reading).toBe(galaxy.readingRadius);
		tuning.rest(900);
		expect(galaxyDocumentSchema.parse(tuning.document).readingRadius).toBe(200);
	});

	it('the chart reaches past the outermost measured point', () => {
		const { tuning } = makeTuning({ points: [{ radius: 40, speed: 200, error: 4 }] });
		expect(tuning.radii.at(-1)).toBeGreaterThan(40);
	});
});

describe('another law', () => {
	it('takes unlit matter out, leaves no way to mark matter unlit, and one undo brings both back', () => {
		const { tuning, told } = makeTuning();
		const before = tuning.document;
		const litOf = (document: typeof before) => document.model.components.filter((c) => c.lit);
		expect(litOf(before).length).toBeLessThan(before.model.components.length);
		tuning.changeLaw('modified-simple');
		expect(tuning.document.model).toEqual({ components: litOf(before), law: 'modified-simple' });
		expect(tuning.litOnly).toBe(true);
		expect(told).toEqual(['Unlit matter was taken out']);
		expect(tuning.model.circularVelocity(20)).toBeGreaterThan(tuning.newton.circularVelocity(20));
		const names = tuning.curves.map(({ key, name }) => `${key} ${name}`);
		expect(names).toContain('+total By this law');
		expect(names).toContain('+lit Lit, Newton’s law');
		tuning.undo();
		expect(tuning.document).toEqual(before);
		expect(tuning.litOnly).toBe(false);
	});
});
