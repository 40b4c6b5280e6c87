import { describe, expect, it } from 'vitest';
import { massModel } from '../../../src/lib/dynamics';
import {
	candidateKey,
	freeCandidates,
	usuallyFree
} from '../../../src/routes/(office)/galaxies/tuning/fit/freeCandidates';
import { haloChoices } from '../../../src/routes/(office)/galaxies/tuning/fit/haloChoices';
import { settling } from '../../../src/routes/(office)/galaxies/tuning/fit/settling';
import { galaxy } from '../../show/support/content';

const { model } = galaxy;
const lit = model.components.filter((one) => one.lit);

describe('what is usually free', () => {
	it('is the halo and the weight of the stars for their light, not sizes and not gas', () => {
		const table = { radii: [1, 2], speeds: [3, 4], massToLight: 1 };
		const components = [
			{ id: 'gas', kind: 'tabulated', parameters: table, lit: true },
			{ id: 'disc', kind: 'tabulated', parameters: table, lit: true },
			{ id: 'bulge', kind: 'hernquist', parameters: { mass: 1e9, scaleLength: 1 }, lit: true },
			{
				id: 'halo',
				kind: 'nfw',
				parameters: { mass200: 1e12, concentration: 9, hubble: 70 },
				lit: false
			}
		] as const;
		expect(usuallyFree(freeCandidates([...components]))).toEqual([
			candidateKey('disc', 'massToLight'),
			candidateKey('halo', 'mass200'),
			candidateKey('halo', 'concentration')
		]);
	});
});

describe('halos to compare', () => {
	const ticked = [candidateKey(lit[0].id, 'mass')];
	const choices = haloChoices(model, ticked);
	it('each take the place of the unlit matter and leave the lit as it is', () => {
		expect(choices.map(({ kind }) => kind).sort()).toEqual([
			'burkert',
			'einasto',
			'nfw',
			'pseudo-isothermal'
		]);
		for (const { spec, kind } of choices) {
			expect(spec.components.slice(0, -1)).toEqual(lit);
			expect(spec.components.at(-1)).toMatchObject({ kind, lit: false });
			expect(massModel(spec).circularVelocity(8)).toBeGreaterThan(0);
		}
	});
	it('free two numbers of each halo and what is ticked of the lit matter', () => {
		for (const { spec, free } of choices) {
			const halo = spec.components.at(-1)?.id;
			expect(free.filter(({ componentId }) => componentId === halo)).toHaveLength(2);
			expect(free.filter(({ componentId }) => componentId !== halo)).toHaveLength(
				lit[0].kind === 'exponential-disk' ? 0 : 1
			);
		}
	});
	it('begin from the galaxy’s own halo where it is of that kind', () => {
		const own = model.components.find((one) => !one.lit);
		const same = choices.find(({ kind }) => kind === own?.kind);
		expect(same?.spec.components.at(-1)).toEqual(own);
	});
});

describe('settling', () => {
	const to = {
		...model,
		components: model.components.map((one) =>
			one.lit ? one : { ...one, parameters: { density: 2e7, scaleRadius: 30 } }
		)
	};
	it('begins at one model, ends exactly at the other, and passes between them', () => {
		const halo = (share: number) => settling(model, to, share).components.find((one) => !one.lit);
		expect(halo(0)?.parameters).toEqual(model.components.find((one) => !one.lit)?.parameters);
		expect(settling(model, to, 1)).toBe(to);
		const middle = Number(halo(0.5)?.parameters.density);
		expect(middle).toBeGreaterThan(8e6);
		expect(middle).toBeLessThan(2e7);
	});
});
