import { describe, expect, test } from 'vitest';
import {
	circularSpeedSlope,
	discSurfaceDensity,
	halfLightRadius3d,
	halfMassRadius,
	lineFrequency,
	lineShift,
	massModel,
	oortConstants,
	overtaking,
	peakSpeed,
	resonances,
	toomreQ,
	virialMass,
	wolfMass
} from '../../src/lib/dynamics';
import { G } from '../../src/lib/units';
import { near } from './near';
import { oneComponent } from './oneComponent';

describe('Oort’s constants', () => {
	test('A = −B = v/2R on a flat curve, and the slope is 0', () => {
		const model = oneComponent('logarithmic', { speed: 200, coreRadius: 0.001, axisRatio: 1 });
		const { A, B } = oortConstants(model, 8);
		near(A, 200 / 16, 1e-7);
		near(B, -200 / 16, 1e-7);
		expect(Math.abs(circularSpeedSlope(model, 8))).toBeLessThan(1e-5);
	});
	test('A = 3Ω/4, B = −Ω/4 round a point, where v falls as R^−½', () => {
		const model = oneComponent('point-mass', { mass: 1e11 });
		const omega = model.circularFrequency(8);
		near(oortConstants(model, 8).A, 0.75 * omega, 1e-12);
		near(oortConstants(model, 8).B, -0.25 * omega, 1e-12);
		near(circularSpeedSlope(model, 8), -model.circularVelocity(8) / 16, 1e-12);
	});
	test('A = 0, B = −Ω in a solid body', () => {
		const model = oneComponent('plummer', { mass: 1e10, scaleLength: 100 });
		const { A, B } = oortConstants(model, 0.01);
		expect(Math.abs(A / B)).toBeLessThan(1e-7);
		near(B, -model.circularFrequency(0.01), 1e-7);
	});
});

describe('resonances', () => {
	test('on a flat curve lie at v/Ωp times 1 and 1 ∓ √2/m', () => {
		const model = oneComponent('logarithmic', { speed: 220, coreRadius: 0.001, axisRatio: 1 });
		const found = resonances(model, 25, { arms: 4 });
		// κ = √2 Ω: Binney and Tremaine 2008, Sec. 3.2.3.
		const at = (share: number) => (220 / 25) * (1 + share * (Math.SQRT2 / 4));
		expect(found.corotation).toHaveLength(1);
		near(found.corotation[0], at(0), 1e-6);
		near(found.innerLindblad[0], at(-1), 1e-6);
		near(found.outerLindblad[0], at(1), 1e-6);
	});
	test('may be two inside, or none', () => {
		const model = oneComponent('miyamoto-nagai', { mass: 6e10, scaleLength: 3, scaleHeight: 0.3 });
		expect(resonances(model, 5).innerLindblad).toHaveLength(2);
		expect(resonances(model, 500).corotation).toEqual([]);
	});
});

test('the NFW halo peaks at 2.16258 scale radii, the thin disc near 2.15 lengths', () => {
	const halo = peakSpeed(oneComponent('nfw', { density: 8e6, scaleRadius: 20 }), 0.01, 1000);
	near(halo.radius, 2.1625815870646 * 20, 1e-6);
	const disc = peakSpeed(
		oneComponent('exponential-disk', { surfaceDensity: 8e8, scaleLength: 2.5 })
	);
	// Freeman 1970; the digits from the table of 60-digit values.
	near(disc.radius / 2.5, 2.15, 3e-3);
	near(disc.speed, 0.88 * Math.sqrt(Math.PI * G * 8e8 * 2.5), 2e-3);
});

test('half of the mass lies inside the published radii', () => {
	near(
		halfMassRadius(oneComponent('plummer', { mass: 1e9, scaleLength: 2 })),
		2 / Math.sqrt(2 ** (2 / 3) - 1),
		1e-8
	);
	near(
		halfMassRadius(oneComponent('hernquist', { mass: 1e9, scaleLength: 2 })),
		2 * (1 + Math.SQRT2),
		1e-8
	);
	near(halfMassRadius(oneComponent('jaffe', { mass: 1e9, scaleLength: 2 })), 2, 1e-8);
	expect(halfMassRadius(oneComponent('nfw', { density: 1e7, scaleRadius: 9 }))).toBe(Infinity);
	expect(halfMassRadius(oneComponent('point-mass', { mass: 1e9 }))).toBe(0);
	expect(halfMassRadius(massModel({ components: [] }))).toBeNaN();
});

describe('where unlit matter overtakes lit matter', () => {
	const star = { id: 'star', kind: 'point-mass', parameters: { mass: 1e10 }, lit: true } as const;
	const halo = (density: number) =>
		({
			id: 'halo',
			kind: 'pseudo-isothermal',
			parameters: { density, coreRadius: 2 },
			lit: false
		}) as const;
	test('both radii of a point in a halo are where the halo holds as much', () => {
		const model = massModel({ components: [star, halo(2e7)] });
		const { pull, mass } = overtaking(model);
		near(model.unlit().enclosedMass(mass ?? NaN), 1e10, 1e-9);
		near(pull ?? NaN, mass ?? NaN, 1e-9);
	});
	test('is nowhere where the halo is too thin or missing, and at the centre without light', () => {
		expect(overtaking(massModel({ components: [star, halo(10)] }))).toEqual({
			pull: null,
			mass: null
		});
		expect(overtaking(massModel({ components: [halo(1e7)] })).mass).toBe(0.001);
	});
});

describe('Toomre’s Q', () => {
	const disc = { surfaceDensity: 8e8, scaleLength: 2.5 };
	test('is σκ/(3.36 GΣ) of a thin disc, by hand', () => {
		const model = oneComponent('exponential-disk', disc);
		const surface = 8e8 * Math.exp(-8 / 2.5);
		near(discSurfaceDensity(model, 8), surface, 1e-9);
		near(toomreQ(model, 8, 35), (35 * model.epicycleFrequency(8)) / (3.36 * G * surface), 1e-9);
	});
	test('counts a disc with thickness by what stands over each place', () => {
		const model = oneComponent('miyamoto-nagai', { mass: 5e10, scaleLength: 3, scaleHeight: 0.3 });
		let sum = 0;
		for (let z = -400; z < 400; z += 0.002) sum += model.density(8, z + 0.001) * 0.002;
		near(discSurfaceDensity(model, 8), sum, 1e-6);
	});
	test('is not to be had without a disc', () => {
		expect(toomreQ(oneComponent('plummer', { mass: 1e10, scaleLength: 1 }), 8, 30)).toBeNaN();
	});
});

describe('the 21 cm line', () => {
	test('shifts by f v sin i / c for small speeds, both ways', () => {
		near(lineShift(200, 90), (1420.405751768 * 200) / 299792.458, 1e-3);
		near(lineShift(-200, 30), (-1420.405751768 * 100) / 299792.458, 1e-3);
		expect(lineShift(200, 0)).toBe(0);
	});
	test('is the relativistic shift: one tenth of c comes down by √(0.9/1.1)', () => {
		near(lineFrequency(-29979.2458, 90), 1420.405751768 * Math.sqrt(0.9 / 1.1), 1e-12);
		near(lineFrequency(250, 60) - 1420.405751768, lineShift(250, 60), 1e-9);
	});
});

describe('a swarm', () => {
	test('of 10 km/s and 0.3 kpc weighs 3σ²r/G = 2.09e7 Msun inside', () => {
		// By hand: 3 × 100 × 0.3 / 4.300917e-6.
		near(wolfMass(10, 0.3), 2.09257e7, 1e-5);
		near(wolfMass(10, halfLightRadius3d(0.225)), wolfMass(10, 0.3), 1e-12);
	});
	test('a Plummer sphere is weighed to a few parts in a hundred', () => {
		// Isotropic Plummer sphere, light like mass: the luminosity-weighted mean σ² is π G M/(32 b)
		// (Dejonghe 1987, MNRAS 224, 13; from memory), its 3D half-light radius 1.3048 b.
		const [M, b] = [1e8, 0.5];
		const sigma = Math.sqrt((Math.PI * G * M) / (32 * b));
		const inside = oneComponent('plummer', { mass: M, scaleLength: b }).enclosedMass(1.3048 * b);
		const ratio = wolfMass(sigma, 1.3048 * b) / inside;
		expect(ratio).toBeGreaterThan(0.7);
		expect(ratio).toBeLessThan(1.05);
	});
	test('the uniform sphere has k = 5', () => near(virialMass(10, 2), (5 * 100 * 2) / G, 1e-14));
});
