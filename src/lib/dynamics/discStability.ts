import { G } from '../units';
import { componentKinds } from './componentKinds';
import { gaussLegendre } from './components/gaussLegendre';
import { massModel } from './massModel';
import type { MassModel } from './types';

const rule = gaussLegendre(48);
const isDisc = new Set(
	componentKinds.filter(({ shape }) => shape === 'disc').map(({ kind }) => kind)
);

/**
 * Surface density of a model's lit discs, Msun/kpc²: what lies in the plane plus ∫ρ dz of what has
 * thickness. Tabulated light has no thickness to be had and does not count.
 * @param R kpc
 */
export function discSurfaceDensity(model: MassModel, R: number): number {
	const components = model.spec.components.filter(
		({ kind, lit }) => lit && isDisc.has(kind) && kind !== 'tabulated'
	);
	const discs = massModel({ components });
	let sum = 0;
	// z = sinh u up to 1000 kpc: close steps near the plane, wide ones far from it.
	const last = Math.asinh(1e5);
	for (let panel = 0; panel < 6; panel++) {
		const half = last / 12;
		for (let i = 0; i < rule.nodes.length; i++) {
			const u = half * (2 * panel + 1 + rule.nodes[i]);
			const z = 0.01 * Math.sinh(u);
			sum += rule.weights[i] * half * discs.density(R, z) * 0.01 * Math.cosh(u);
		}
	}
	return discs.sheetDensity(R) + 2 * sum;
}

/**
 * Toomre's Q of the stars, σ κ/(3.36 G Σ): above 1 a disc is calm, below it it falls into rings and
 * clumps. Toomre 1964, ApJ 139, 1217. NaN where there is no disc or circles are unstable.
 * @param R kpc @param dispersion radial velocity dispersion σ, km/s
 */
export function toomreQ(model: MassModel, R: number, dispersion: number): number {
	const surface = discSurfaceDensity(model, R);
	if (!(surface > 0)) return NaN;
	return (dispersion * model.epicycleFrequency(R)) / (3.36 * G * surface);
}
