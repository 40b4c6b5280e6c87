import { existsSync, readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { fitRotationCurve, type ComponentSpec } from '../../../src/lib/dynamics';

/**
 * Measured curves of SPARC (Lelli, McGaugh and Schombert 2016, AJ 152, 157). The points belong to
 * their authors and are not in this project; where they are not at hand these tests are skipped.
 */
const folder = new URL('../../../../shared/reference/sparc/', import.meta.url);
const here = existsSync(folder);
if (!here) console.info('The SPARC curves are not on this machine: their three fits are skipped.');

/** χ² of scipy 1.17 least_squares, best of 40 starts; stars 0.05 to 5, halos within their limits. */
const known: [string, string, Record<string, number>, number][] = [
	['NGC3198', 'pseudo-isothermal', { density: 1e7, coreRadius: 3 }, 49.6887298],
	['NGC3198', 'nfw', { density: 1e7, scaleRadius: 10 }, 55.4707067],
	['NGC3198', 'nfw', { mass200: 1e12, concentration: 10, hubble: 70 }, 55.4707067],
	['NGC3198', 'burkert', { density: 1e7, coreRadius: 5 }, 56.1638798],
	['NGC2403', 'pseudo-isothermal', { density: 1e7, coreRadius: 3 }, 748.75115],
	['NGC2403', 'nfw', { density: 1e7, scaleRadius: 10 }, 639.663396],
	['NGC2403', 'nfw', { mass200: 1e12, concentration: 10, hubble: 70 }, 639.663396],
	['NGC2403', 'burkert', { density: 1e7, coreRadius: 5 }, 800.383307],
	['DDO154', 'pseudo-isothermal', { density: 1e7, coreRadius: 3 }, 19.7220409],
	['DDO154', 'nfw', { density: 1e7, scaleRadius: 10 }, 82.0553963],
	['DDO154', 'nfw', { mass200: 1e12, concentration: 10, hubble: 70 }, 82.0553963],
	['DDO154', 'burkert', { density: 1e7, coreRadius: 5 }, 10.2312182]
];

describe.skipIf(!here)('SPARC', () => {
	test.each(known)('%s with %s %j', (name, kind, parameters, chiSquared) => {
		const rows = readFileSync(new URL(`${name}_rotmod.dat`, folder), 'utf8')
			.split('\n')
			.filter((line) => line.trim() !== '' && !line.startsWith('#'))
			.map((line) => line.trim().split(/\s+/).map(Number));
		const radii = rows.map(([radius]) => radius);
		const light = (id: string, column: number): ComponentSpec => ({
			id,
			kind: 'tabulated',
			parameters: { radii, speeds: rows.map((row) => row[column]), massToLight: 1 },
			lit: true
		});
		const components = [
			light('gas', 3),
			light('disc', 4),
			{ id: 'halo', kind, parameters, lit: false } as ComponentSpec
		];
		const free = [
			{ componentId: 'disc', parameter: 'massToLight', min: 0.05, max: 5 },
			...Object.keys(parameters)
				.filter((parameter) => parameter !== 'hubble')
				.map((parameter) => ({ componentId: 'halo', parameter }))
		];
		const points = rows.map(([radius, speed, error]) => ({ radius, speed, error }));
		const result = fitRotationCurve({ spec: { components }, points, free });
		expect(result.chiSquared / chiSquared).toBeLessThan(1 + 1e-6);
		expect(result.chiSquared / chiSquared).toBeGreaterThan(1 - 1e-6);
	});
});
