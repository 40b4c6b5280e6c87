import { G } from '../../units';
import type { MassComponent } from '../types';

/** A spherical body by its radial functions; r ≥ 0 in kpc, with their limits at r = 0. */
export interface SphericalProfile {
	/** G M(r) / r, (km/s)². */
	circularVelocitySquared(r: number): number;
	/** G M(r) / r³, (km/s/kpc)². Infinity at the centre of a cusp. */
	circularFrequencySquared(r: number): number;
	/** Msun. */
	enclosedMass(r: number): number;
	/** Msun/kpc³. */
	density(r: number): number;
	/** (km/s)². */
	potential(r: number): number;
	escapable: boolean;
}

/**
 * Any spherical body as a component. κ² = Ω² + 4πGρ, which is R dΩ²/dR + 4Ω² with
 * dM/dr = 4πr²ρ put in; ν² = Ω², since the pull towards the plane is Ω² z near it.
 */
export function sphericalComponent(profile: SphericalProfile): MassComponent {
	return {
		circularVelocitySquared: profile.circularVelocitySquared,
		addFrequenciesSquared(R, scale, _sheetHeight, sums) {
			const omega = scale * profile.circularFrequencySquared(R);
			sums.omega += omega;
			sums.kappa += omega + scale * 4 * Math.PI * G * profile.density(R);
			sums.nu += omega;
		},
		enclosedMass: profile.enclosedMass,
		potential: (R, z) => profile.potential(Math.hypot(R, z)),
		addAcceleration(R, z, scale, out) {
			const r = Math.hypot(R, z);
			// At the very centre the pulls from all sides cancel, in a cusp too.
			if (r === 0) return;
			const omega = scale * profile.circularFrequencySquared(r);
			out.R -= omega * R;
			out.z -= omega * z;
		},
		density: (R, z) => profile.density(Math.hypot(R, z)),
		sheetDensity: () => 0,
		escapable: profile.escapable
	};
}
