import { burkert } from './components/burkert';
import type { ComponentMaker } from './components/ComponentMaker';
import { dehnen } from './components/dehnen';
import { doublePowerLaw } from './components/doublePowerLaw';
import { einasto } from './components/einasto';
import { exponentialDisk } from './components/exponentialDisk';
import { hernquist } from './components/hernquist';
import { isochrone } from './components/isochrone';
import { jaffe } from './components/jaffe';
import { kuzminDisk } from './components/kuzminDisk';
import { logarithmic } from './components/logarithmic';
import { miyamotoNagai } from './components/miyamotoNagai';
import { nfw } from './components/nfw';
import { plummer } from './components/plummer';
import { pointMass } from './components/pointMass';
import { pseudoIsothermal } from './components/pseudoIsothermal';
import { sersic } from './components/sersic';
import { tabulated } from './components/tabulated';
import type { ComponentKind, ComponentKindInfo, ParameterSet } from './types';

/** Every kind with its maker. A new kind is one line here and one in `ComponentKind`. */
export const makers: Record<ComponentKind, ComponentMaker> = {
	'exponential-disk': exponentialDisk,
	'miyamoto-nagai': miyamotoNagai,
	'kuzmin-disk': kuzminDisk,
	hernquist,
	sersic,
	plummer,
	jaffe,
	dehnen,
	isochrone,
	'point-mass': pointMass,
	tabulated,
	nfw,
	'pseudo-isothermal': pseudoIsothermal,
	burkert,
	einasto,
	'double-power-law': doublePowerLaw,
	logarithmic
};

/** What forms are built from: every kind, in the order people should meet them. */
export const componentKinds: ComponentKindInfo[] = Object.values(makers).map((maker) => maker.info);

export function isComponentKind(value: unknown): value is ComponentKind {
	return typeof value === 'string' && Object.hasOwn(makers, value);
}

/** Every parameter of a set by name: numbers, words and lists. */
export const parameterNames = (set: ParameterSet): string[] =>
	[...set.parameters, ...(set.choices ?? []), ...(set.lists ?? [])].map(({ name }) => name);

/**
 * Which way of giving the parameters is meant: the one that shares most names with those given,
 * the first of equals.
 */
export function parameterSetOf(kind: ComponentKind, given: readonly string[]): ParameterSet {
	const { parameterSets } = makers[kind].info;
	const shared = (set: ParameterSet) =>
		parameterNames(set).filter((name) => given.includes(name)).length;
	return parameterSets.reduce((best, set) => (shared(set) > shared(best) ? set : best));
}
