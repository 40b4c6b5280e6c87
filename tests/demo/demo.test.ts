import { describe, expect, it } from 'vitest';
import { massBreakdown, massModel, orbitTimeMyr } from '../../src/lib/dynamics';
import { inventMeasurements } from '../../src/lib/measurements/invent';
import { demoGalaxies } from '../../src/lib/server/demo/galaxies';
import { demoShow } from '../../src/lib/server/demo/show';
import type { EditionContent } from '../../src/lib/show/edition';
import { showDocumentSchema } from '../../src/lib/show/document';
import { findFaults } from '../../src/lib/show/freeze';
import { galaxyDocumentSchema } from '../../src/lib/show/galaxy';
import { fillFigures } from '../../src/lib/show/figures';
import { effectiveModel, sceneSettings } from '../../src/lib/show/settings';
import { totalSeconds } from '../../src/lib/show/timing';
import { kpcFromLightYears } from '../../src/lib/units';

const ids = {
	wheel: '00000000-0000-4000-8000-000000000001',
	dwarf: '00000000-0000-4000-8000-000000000002',
	orchard: '00000000-0000-4000-8000-000000000003'
};
const show = demoShow(ids);
const measured = (name: keyof typeof ids) => {
	const { document, points } = demoGalaxies[name];
	return inventMeasurements(massModel(document.model), points);
};
const content: EditionContent = {
	format: 1,
	show,
	galaxies: Object.fromEntries(
		(Object.keys(ids) as (keyof typeof ids)[]).map((name) => [
			ids[name],
			{
				document: demoGalaxies[name].document,
				measured: measured(name),
				measuredSource: 'Invented.'
			}
		])
	)
};
const wheel = massModel(demoGalaxies.wheel.document.model);
const R30 = kpcFromLightYears(30_000);
const R60 = kpcFromLightYears(60_000);

describe('the demo galaxies', () => {
	it('are whole galaxy documents that say they are invented', () => {
		for (const { document } of Object.values(demoGalaxies)) {
			expect(galaxyDocumentSchema.parse(document)).toEqual(document);
			expect(document.sources).toContain('Invented');
		}
	});
	it('land near the round figures of the trade: 200 km/s and 200 to 300 million years at 30,000 light years', () => {
		// Common practice, no source: about 200 km/s, a turn of about 200 million years.
		expect(wheel.circularVelocity(R30)).toBeGreaterThan(195);
		expect(wheel.circularVelocity(R30)).toBeLessThan(215);
		expect(orbitTimeMyr(wheel, R30)).toBeGreaterThan(200);
		expect(orbitTimeMyr(wheel, R30)).toBeLessThan(300);
	});
	it('have a flat curve where the light alone falls', () => {
		const flat = wheel.circularVelocity(R60) / wheel.circularVelocity(R30);
		const falls = wheel.lit().circularVelocity(R60) / wheel.lit().circularVelocity(R30);
		expect(Math.abs(flat - 1)).toBeLessThan(0.05);
		expect(falls).toBeLessThan(0.8);
	});
	it('hold several times more unlit than lit matter inside 60,000 light years', () => {
		const { ratio } = massBreakdown(wheel, R60);
		expect(ratio).toBeGreaterThan(4);
		expect(ratio).toBeLessThan(10);
	});
	it('would lose the stars at 50,000 light years without the halo, as the script says', () => {
		const R50 = kpcFromLightYears(50_000);
		expect(wheel.lit().escapeVelocity(R50)).toBeLessThan(wheel.circularVelocity(R50));
	});
	it('have an Orchard whose light nearly suffices inside', () => {
		const orchard = massModel(demoGalaxies.orchard.document.model);
		const R = kpcFromLightYears(15_000);
		const share = orchard.lit().circularVelocity(R) / orchard.circularVelocity(R);
		expect(share).toBeGreaterThan(0.9);
		expect(share).toBeLessThan(1);
	});
});

describe('inventMeasurements', () => {
	it('gives the same points for the same seed, scattered by their errors', () => {
		const points = measured('wheel');
		expect(points).toEqual(measured('wheel'));
		expect(points).toHaveLength(26);
		const pulls = points.map((p) => (p.speed - wheel.circularVelocity(p.radius)) / p.error);
		const chi2 = pulls.reduce((sum, x) => sum + x * x, 0);
		// 26 degrees of freedom: below 5 and above 60 each have a chance under 1e-4.
		expect(chi2).toBeGreaterThan(5);
		expect(chi2).toBeLessThan(60);
	});
});

describe('the demo show', () => {
	it('has twelve scenes and lasts about 25 minutes', () => {
		expect(showDocumentSchema.parse(show)).toEqual(show);
		expect(show.scenes).toHaveLength(12);
		expect(totalSeconds(show) / 60).toBeGreaterThan(24);
		expect(totalSeconds(show) / 60).toBeLessThan(26);
	});
	it('can be frozen as it stands', () => {
		expect(findFaults(content)).toEqual([]);
	});
	it('computes every figure in its words', () => {
		let figures = 0;
		for (const scene of show.scenes) {
			const id = scene.subject.kind === 'galaxy' ? scene.subject.galaxyId : null;
			const galaxy = id ? content.galaxies[id] : null;
			const model = galaxy
				? massModel(effectiveModel(galaxy.document, sceneSettings(scene, {})))
				: null;
			for (const part of fillFigures(`${scene.script}\n${scene.drawings.caption}`, {
				model,
				measured: galaxy?.measured ?? [],
				outerRadius: galaxy?.document.look.outerRadius ?? 1
			})) {
				if (part.kind !== 'figure') continue;
				figures++;
				expect(part.figure, `${scene.title}: ${part.figure.source}`).toMatchObject({ ok: true });
			}
		}
		expect(figures).toBeGreaterThan(20);
	});
	it('leaves a third of its time unspoken at 130 words a minute', () => {
		// Common practice, no source: narration of 130 to 150 words a minute, a third of it silence.
		const words = show.scenes.reduce((n, s) => n + s.script.split(/\s+/).length, 0);
		expect(words / 130).toBeLessThan((totalSeconds(show) / 60) * (2 / 3));
	});
});
