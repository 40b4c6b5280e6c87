import { expect, test } from 'vitest';
import {
	criticalDensity,
	nfwHalo,
	orbitTimeMyr,
	type MassModel
} from '../../src/lib/dynamics/index';
import { G, KPC_PER_GYR_IN_KM_S, LIGHT_YEARS_PER_KPC } from '../../src/lib/units';
import { near } from './near';
import { oneComponent } from './oneComponent';

/** Radius of the highest speed by golden section, kpc. */
function peakRadius(model: MassModel, from: number, to: number): number {
	const golden = (Math.sqrt(5) - 1) / 2;
	while (to - from > 1e-7 * to) {
		const left = to - golden * (to - from);
		const right = from + golden * (to - from);
		if (model.circularVelocity(left) > model.circularVelocity(right)) to = right;
		else from = left;
	}
	return (from + to) / 2;
}

/** Radius that holds half of `mass`, by bisection, kpc. */
function halfMassRadius(model: MassModel, mass: number): number {
	let from = 0;
	let to = 100;
	for (let i = 0; i < 60; i++) {
		const middle = (from + to) / 2;
		if (model.enclosedMass(middle) < mass / 2) from = middle;
		else to = middle;
	}
	return to;
}

// Nominal solar mass parameter 1.3271244e20 m³/s² (IAU 2015 resolution B3) and the IAU parsec
// 648000/π au, au = 149597870700 m.
test('G follows from the nominal solar mass parameter and the parsec', () => {
	const kpc = (1000 * 648000 * 149597870700) / Math.PI;
	near(G, 1.3271244e20 / kpc / 1e6, 1e-12);
});

// Derived: Julian year 31557600 s, Julian light year, IAU parsec.
test('1 km/s is 1.02271 kpc/Gyr and 1 kpc is 3261.56 light years', () => {
	const kpc = (1000 * 648000 * 149597870700) / Math.PI;
	near(KPC_PER_GYR_IN_KM_S, (1000 * 31557600 * 1e9) / kpc, 1e-11);
	near(LIGHT_YEARS_PER_KPC, kpc / (299792458 * 31557600), 1e-9);
});

// Definition: 3 H0² / (8πG).
test('the critical density for 70 km/s/Mpc is 135.99 Msun/kpc³', () => {
	near(criticalDensity(70), 135.99, 5e-5);
});

// Freeman 1970, ApJ 160, 811; Binney and Tremaine 2008, Sec. 2.6. From memory; the digits beyond
// those of the memory are those of an mpmath root at 60 digits.
test('the thin exponential disc peaks at 2.15 scale lengths with 0.88 √(πGΣ0Rd)', () => {
	const surfaceDensity = 6e8;
	const scaleLength = 3.2;
	const disc = oneComponent('exponential-disk', { surfaceDensity, scaleLength });
	const R = peakRadius(disc, 1, 20);
	near(R / scaleLength, 2.15, 5e-4);
	near(R / scaleLength, 2.150053545139513, 1e-6);
	const peak = disc.circularVelocity(R);
	near(peak / Math.sqrt(Math.PI * G * surfaceDensity * scaleLength), 0.88, 1e-3);
	const mass = 2 * Math.PI * surfaceDensity * scaleLength ** 2;
	near(peak / Math.sqrt((G * mass) / scaleLength), 0.6221297316283042, 1e-9);
});

// Derived from Navarro, Frenk and White 1997, ApJ 490, 493.
test('the NFW halo peaks at 2.16258 scale radii with vmax/v200 = √(0.2162 c / m(c))', () => {
	const parameters = { mass200: 8e11, concentration: 12, hubble: 70 };
	const halo = nfwHalo(8e11, 12, 70);
	const model = oneComponent('nfw', parameters);
	const R = peakRadius(model, 1, 200);
	near(R / halo.scaleRadius, 2.16258, 3e-6);
	const m = Math.log(13) - 12 / 13;
	near(model.circularVelocity(R) / halo.speed200, Math.sqrt((0.2162 * 12) / m), 1e-4);
	near(model.circularVelocity(halo.radius200), halo.speed200, 1e-12);
	near(model.enclosedMass(halo.radius200), 8e11, 1e-12);
});

// Derived, same source: v200 = 10 H0 r200 for overdensity 200.
test('v200 is 10 H0 r200', () => {
	for (const [mass, concentration, hubble] of [
		[1e10, 15, 70],
		[1e12, 10, 67.4],
		[3e13, 5, 73]
	]) {
		const halo = nfwHalo(mass, concentration, hubble);
		near(halo.speed200, (10 * hubble * halo.radius200) / 1000, 1e-12);
	}
});

// Derived: Plummer 1911; Hernquist 1990.
test('half of the mass is inside 1.3048 b (Plummer) and (1 + √2) a (Hernquist)', () => {
	const plummer = oneComponent('plummer', { mass: 2e10, scaleLength: 0.7 });
	near(halfMassRadius(plummer, 2e10) / 0.7, 1.3048, 3e-5);
	near(halfMassRadius(plummer, 2e10) / 0.7, 1.3047660265041067, 1e-9);
	const hernquist = oneComponent('hernquist', { mass: 2e10, scaleLength: 0.7 });
	near(halfMassRadius(hernquist, 2e10) / 0.7, 1 + Math.SQRT2, 1e-9);
});

// Binney and Tremaine 2008, Sec. 3.2; derived. A pseudo-isothermal halo far out is flat to 1 part
// in r/rc, so the ratio is looked at from 1e5 core radii on.
test('where the curve is flat κ is √2 Ω, and A = −B = v/(2R)', () => {
	const halo = oneComponent('pseudo-isothermal', { density: 1e9, coreRadius: 0.01 });
	const R = 1e5;
	const omega = halo.circularFrequency(R);
	const kappa = halo.epicycleFrequency(R);
	near(kappa / omega, Math.SQRT2, 1e-6);
	// κ² = −4BΩ and A − B = Ω.
	const B = -(kappa ** 2) / (4 * omega);
	near(B, -halo.circularVelocity(R) / (2 * R), 1e-6);
	near(omega + B, halo.circularVelocity(R) / (2 * R), 1e-6);
});

// Mechanics.
test('around a point mass κ is Ω and v²r is GM', () => {
	const point = oneComponent('point-mass', { mass: 3e9 });
	for (const r of [1e-4, 0.5, 8, 300]) {
		near(point.epicycleFrequency(r), point.circularFrequency(r), 1e-14);
		near(point.circularVelocity(r) ** 2 * r, G * 3e9, 1e-14);
		near(point.dynamicalMass(r), 3e9, 1e-14);
	}
});

// Mechanics: a core of even density turns as a solid body.
test('in an even core κ is 2 Ω', () => {
	for (const core of [
		oneComponent('plummer', { mass: 1e10, scaleLength: 2 }),
		oneComponent('pseudo-isothermal', { density: 1e8, coreRadius: 2 }),
		oneComponent('burkert', { density: 1e8, coreRadius: 2 })
	]) {
		near(core.epicycleFrequency(1e-7) / core.circularFrequency(1e-7), 2, 1e-7);
		near(core.epicycleFrequency(0) / core.circularFrequency(0), 2, 1e-14);
	}
});

// Definition.
test('the pseudo-isothermal speed tends to √(4πGρ0) rc', () => {
	const halo = oneComponent('pseudo-isothermal', { density: 4e7, coreRadius: 1.5 });
	const limit = Math.sqrt(4 * Math.PI * G * 4e7) * 1.5;
	// 1 − atan(x)/x falls short by π/(4x) of the speed, in half.
	near(halo.circularVelocity(1.5e6), limit, 1e-6);
	expect(halo.escapeVelocity(8)).toBe(Infinity);
});

// Planets: semi-major axes in au (JPL approximate elements for J2000) and sidereal periods in years
// (fact sheets); from memory. Axes and periods are means over different spans, hence 0.1 %.
test('one solar mass carries all eight planets around to 0.1 %', () => {
	const kpcPerAu = Math.PI / (648000 * 1000);
	const sun = oneComponent('point-mass', { mass: 1 });
	for (const [axis, years] of [
		[0.3871, 0.24085],
		[0.72333, 0.6152],
		[1, 1.00002],
		[1.52368, 1.88085],
		[5.2026, 11.862],
		[9.53668, 29.457],
		[19.18916, 84.02],
		[30.06992, 164.79]
	]) {
		near(orbitTimeMyr(sun, axis * kpcPerAu) * 1e6, years, 1e-3, `at ${axis} au`);
	}
});
