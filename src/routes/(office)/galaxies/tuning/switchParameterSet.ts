import { nfwHalo, parameterSetOf } from '$lib/dynamics';
import { numbersOf } from '$lib/dynamics/parameterValues';
import { nfwMassFunction } from '$lib/dynamics/components/nfwHalo';
import type { ComponentSpec, ParameterSet } from '$lib/dynamics/types';

/** Hubble constant that the form begins with, km/s/Mpc. */
const usualHubble = 70;
const leastConcentration = 1;
const mostConcentration = 100;

/** Digits that a form shows: enough that the curve does not move by more than a pixel. */
const rounded = (value: number) => Number(value.toPrecision(6));

/**
 * The concentration whose halo has this density, by halving the interval: the density rises with it.
 * @param density ρ0, Msun/kpc³ @param hubble km/s/Mpc
 * @returns NaN where none from 1 to 100 has
 */
function concentrationOf(density: number, hubble: number): number {
	const densityAt = (c: number) => nfwHalo(1e12, c, hubble).density;
	let low = leastConcentration;
	let high = mostConcentration;
	if (!(density >= densityAt(low) && density <= densityAt(high))) return NaN;
	for (let i = 0; i < 60; i++) {
		const middle = (low + high) / 2;
		if (densityAt(middle) < density) low = middle;
		else high = middle;
	}
	return (low + high) / 2;
}

/**
 * The same halo given by another set of parameters.
 * @returns null where the other set cannot describe it
 */
export function switchParameterSet(
	component: ComponentSpec,
	to: ParameterSet
): Record<string, number> | null {
	const { kind } = component;
	const from = parameterSetOf(kind, Object.keys(component.parameters));
	const parameters = numbersOf(component.parameters, from);
	if (from.id === to.id) return parameters;
	if (kind !== 'nfw') return null;
	if (to.id === 'density') {
		const { density, scaleRadius } = nfwHalo(
			parameters.mass200,
			parameters.concentration,
			parameters.hubble
		);
		return fits(to, { density: rounded(density), scaleRadius: rounded(scaleRadius) });
	}
	const concentration = concentrationOf(parameters.density, usualHubble);
	if (Number.isNaN(concentration)) return null;
	const mass200 =
		4 * Math.PI * parameters.density * parameters.scaleRadius ** 3 * nfwMassFunction(concentration);
	return fits(to, {
		mass200: rounded(mass200),
		concentration: rounded(concentration),
		hubble: usualHubble
	});
}

const fits = (set: ParameterSet, parameters: Record<string, number>) =>
	set.parameters.every(({ name, min, max }) => parameters[name] >= min && parameters[name] <= max)
		? parameters
		: null;
