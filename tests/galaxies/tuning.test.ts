import { describe, expect, it, vi } from 'vitest';
import { componentKinds, massBreakdown, massModel } from '../../src/lib/dynamics';
import { chartRadii, speedCurves, topSpeed } from '../../src/lib/components/chart/speedCurves';
import {
	galaxyDocumentSchema,
	galaxyLookSchema,
	type GalaxyDocument
} from '../../src/lib/show/galaxy';
import { demoGalaxies } from '../../src/lib/server/demo/galaxies';
import { galaxyDifferences } from '../../src/routes/(office)/galaxies/tuning/galaxyDifferences';
import { lookSettings } from '../../src/routes/(office)/galaxies/tuning/lookSettings';
import { readOuts } from '../../src/routes/(office)/galaxies/tuning/readOuts';
import { radiusAt, ringPath } from '../../src/routes/(office)/galaxies/tuning/ringPath';
import { Tuning } from '../../src/routes/(office)/galaxies/tuning/Tuning.svelte';

const wheel = demoGalaxies.wheel.document;
const begin = (mayEdit = true) => {
	const onchange = vi.fn<(document: GalaxyDocument) => void>();
	const ontold = vi.fn<(message: string, undoable?: boolean) => void>();
	const tuning = new Tuning({ document: wheel, points: [], mayEdit, onchange, ontold });
	return { tuning, onchange, ontold };
};
const haloOf = (tuning: Tuning) => {
	const halo = tuning.document.model.components.find((c) => c.id === 'halo');
	if (!halo) throw new Error('no halo');
	return halo;
};
const denser = (tuning: Tuning, density: number) =>
	tuning.changeComponent(
		'halo',
		{ parameters: { ...haloOf(tuning).parameters, density } },
		'density of “Dark halo”',
		'density'
	);

describe('Tuning', () => {
	it('curves and read-outs follow a change in the same tick', () => {
		const { tuning } = begin();
		const before = tuning.model.circularVelocity(20);
		const total = () => tuning.curves.find((c) => c.key === '+total')?.speeds[200] ?? NaN;
		const curve = total();
		denser(tuning, 3e7);
		expect(tuning.model.circularVelocity(20)).toBeGreaterThan(1.2 * before);
		expect(total()).toBeGreaterThan(1.2 * curve);
	});
	it('a drag is one step of undo, and redo brings it back', () => {
		const { tuning, onchange } = begin();
		for (const density of [2e7, 2.5e7, 3e7]) denser(tuning, density);
		expect(tuning.undoLabel).toBe('Changed density of “Dark halo”');
		tuning.undo();
		expect(tuning.document).toBe(wheel);
		tuning.redo();
		expect(haloOf(tuning).parameters.density).toBe(3e7);
		expect(onchange).toHaveBeenCalledTimes(5);
	});
	it('every kind can be added as it is offered, and taken out again', () => {
		const { tuning, ontold } = begin();
		for (const info of componentKinds) {
			tuning.add(info);
			expect(galaxyDocumentSchema.safeParse(tuning.document).error, info.label).toBeUndefined();
		}
		const { components } = tuning.document.model;
		expect(components).toHaveLength(4 + componentKinds.length);
		tuning.remove(components[4]);
		expect(ontold).toHaveBeenLastCalledWith('Removed “Exponential disc”', true);
		tuning.undo();
		expect(tuning.document.model.components).toEqual(components);
	});
	it('what may not be edited can be tried, and nobody is told to save it', () => {
		const { tuning, onchange } = begin(false);
		denser(tuning, 3e7);
		expect(tuning.touched).toBe(true);
		expect(onchange).not.toHaveBeenCalled();
	});
	it('the pointer looks without moving the line; a press moves it', () => {
		const { tuning } = begin();
		tuning.looked = 14;
		expect(tuning.reading).toBe(14);
		tuning.looked = null;
		expect(tuning.reading).toBe(wheel.readingRadius);
		tuning.rest(12);
		expect(tuning.reading).toBe(12);
	});
});

describe('curves', () => {
	const radii = chartRadii(25);
	it('squares of the components sum to the square of the total', () => {
		const curves = speedCurves(wheel.model, massModel(wheel.model), radii);
		const total = curves.find((c) => c.role === 'total');
		if (!total) throw new Error('no total');
		const parts = curves.filter((c) => !c.sum);
		expect(parts).toHaveLength(4);
		for (const i of [0, 60, 239]) {
			const squares = parts.reduce((sum, c) => sum + c.speeds[i] ** 2, 0);
			expect(Math.abs(squares / total.speeds[i] ** 2 - 1)).toBeLessThan(1e-9);
		}
	});
	it('a sum is drawn only where there is more than one', () => {
		const keys = speedCurves(wheel.model, massModel(wheel.model), radii).map((c) => c.key);
		expect(keys).toEqual(['bulge', 'stars', 'gas', 'halo', '+lit', '+total']);
		expect(speedCurves({ components: [] }, massModel({ components: [] }), radii)).toEqual([]);
	});
	it('the axis holds all points and is not set by a point mass in the middle', () => {
		const spec = {
			components: [
				...wheel.model.components,
				{ id: 'hole', kind: 'point-mass' as const, parameters: { mass: 1e8 }, lit: false }
			]
		};
		const curves = speedCurves(spec, massModel(spec), radii);
		expect(topSpeed(curves, radii, [])).toBeLessThanOrEqual(300);
		expect(topSpeed(curves, radii, [{ speed: 390, error: 20 }])).toBeGreaterThan(410);
	});
});

describe('read-outs', () => {
	const read = (document: GalaxyDocument, R: number) =>
		Object.fromEntries(readOuts(massModel(document.model), R).map((row) => [row.key, row]));
	it('say what the model says, each mass under its own label', () => {
		const R = 9.2;
		const model = massModel(wheel.model);
		const { speed, ratio, dynamical, lit, unlit } = read(wheel, R);
		expect(speed.exact).toBe(`${model.circularVelocity(R).toFixed(2)} km/s`);
		const masses = massBreakdown(model, R);
		expect(ratio.exact).toBe(masses.ratio.toFixed(3));
		expect(lit.exact).toBe('2.720 × 10¹⁰ Msun');
		expect(unlit.exact).toBe('5.779 × 10¹⁰ Msun');
		expect(dynamical.exact).toBe('9.168 × 10¹⁰ Msun');
		expect(dynamical.note).toContain('Not the sum');
	});
	it('say that nothing escapes from a halo without end, and nothing of an empty model', () => {
		expect(read(demoGalaxies.orchard.document, 9).escape.words).toBe('nothing escapes');
		const empty = read({ ...wheel, model: { components: [] } }, 9);
		expect(empty.speed.words).toBe('no circular orbit');
		expect(empty.ratio.words).toBe('nothing inside');
	});
});

describe('look settings', () => {
	const look = wheel.look;
	it.each(lookSettings.map((setting) => [setting.range.label, setting] as const))(
		'%s has the limits of the document',
		(_, { range, get, set }) => {
			for (const value of [range.min, range.max]) {
				const changed = set(look, value);
				expect(get(changed)).toBe(value);
				expect(galaxyLookSchema.safeParse(changed).success).toBe(true);
			}
			for (const value of [range.min - range.step, range.max + range.step]) {
				expect(galaxyLookSchema.safeParse(set(look, value)).success).toBe(false);
			}
			expect(range.sliderMin).toBeGreaterThanOrEqual(range.min);
			expect(range.sliderMax).toBeLessThanOrEqual(range.max);
		}
	);
});

describe('the ring on the film', () => {
	const view = { distance: 50, inclination: 52, turn: 0, centreAltitude: 90 };
	const geometry = { apertureDegrees: 56, tiltDegrees: 0 };
	it('is where the radius under the pointer is read', () => {
		for (const R of [1, 8, 20]) {
			const points = ringPath(R, view, geometry).slice(1, -1).split('L');
			for (const point of points) {
				const [u, v] = point.split(',').map(Number);
				expect(Math.abs((radiusAt(u, v, view, geometry) ?? NaN) - R)).toBeLessThan(0.01);
			}
		}
	});
	it('reads nothing outside the film or beside an edge-on disc', () => {
		expect(radiusAt(0.9, 0.9, view, geometry)).toBeNull();
		expect(radiusAt(0, -0.9, { ...view, inclination: 90 }, geometry)).toBeNull();
	});
});

describe('galaxyDifferences', () => {
	it('names each place that differs and nothing else', () => {
		const { tuning } = begin();
		denser(tuning, 3e7);
		tuning.change({ ...tuning.document, name: 'Other' }, 'Changed the name');
		expect(galaxyDifferences(wheel, tuning.document)).toEqual([
			{ what: 'Name', mine: 'Harrow Wheel', theirs: 'Other' },
			{ what: 'Dark halo: density', mine: '11500000', theirs: '30000000' }
		]);
		expect(galaxyDifferences(wheel, structuredClone(wheel))).toEqual([]);
	});
});
