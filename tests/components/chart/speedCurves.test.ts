import { describe, expect, it } from 'vitest';
import { chartRadii, speedCurves, topSpeed } from '../../../src/lib/components/chart/speedCurves';
import { massModel } from '../../../src/lib/dynamics';
import { demoGalaxies } from '../../../src/lib/server/demo/galaxies';

const wheel = demoGalaxies.wheel.document;

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
