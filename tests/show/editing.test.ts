import { describe, expect, it } from 'vitest';
import { showDocumentSchema } from '../../src/lib/show/document';
import { sceneRanges } from '../../src/lib/show/editingControls';
import {
	changeScene,
	copyScene,
	insertScene,
	moveScene,
	newDocument,
	newId,
	newScene,
	orderScenes,
	removeScene
} from '../../src/lib/show/editing';
import { galaxyId, makeContent, makeScene, uuid } from './support/content';

const three = makeContent([1, 2, 3].map((n) => makeScene(n))).show;
const order = (document: typeof three) => document.scenes.map((scene) => scene.id);

describe('editing', () => {
	it('newId gives version 4 UUIDs that the schema takes', () => {
		const ids = Array.from({ length: 50 }, newId);
		expect(new Set(ids).size).toBe(50);
		const document = insertScene(
			newDocument('A', 1),
			newScene(ids[0], { kind: 'galaxy', galaxyId }),
			0
		);
		expect(showDocumentSchema.safeParse(document).error?.issues).toBeUndefined();
	});

	it('newScene goes on from the scene before it', () => {
		const before = makeScene(1, { view: { ...three.scenes[0].view, distance: 99 } });
		const scene = newScene(uuid(7), { kind: 'dark', name: '' }, before);
		expect(scene.subject).toEqual(before.subject);
		expect(scene.view.distance).toBe(99);
		expect(scene.motion.begin).toBe('go-on');
	});

	it('moveScene keeps the position within the list and shares what did not move', () => {
		expect(order(moveScene(three, uuid(1), 1))).toEqual([uuid(2), uuid(1), uuid(3)]);
		expect(order(moveScene(three, uuid(1), 9))).toEqual([uuid(2), uuid(3), uuid(1)]);
		expect(moveScene(three, uuid(1), -4)).toBe(three);
		expect(moveScene(three, uuid(1), 2).scenes[2]).toBe(three.scenes[0]);
	});

	it('orderScenes refuses a list that is not the same set', () => {
		expect(order(orderScenes(three, [uuid(3), uuid(1), uuid(2)]))).toEqual([
			uuid(3),
			uuid(1),
			uuid(2)
		]);
		expect(orderScenes(three, [uuid(3), uuid(1)])).toBe(three);
		expect(orderScenes(three, [uuid(3), uuid(1), uuid(1)])).toBe(three);
	});

	it('copyScene gives the copy and its controls ids of their own', () => {
		const control = {
			id: uuid(50),
			label: 'Halo',
			target: { kind: 'halo-factor' as const },
			min: 0,
			max: 2,
			rest: 1
		};
		const document = makeContent([makeScene(1, { controls: [control] })]).show;
		const copied = copyScene(document, uuid(1));
		expect(copied.scenes).toHaveLength(2);
		expect(copied.scenes[1].title).toBe('Scene 1 (copy)');
		expect(copied.scenes[1].id).not.toBe(uuid(1));
		expect(copied.scenes[1].controls[0].id).not.toBe(uuid(50));
		expect(showDocumentSchema.safeParse(copied).success).toBe(true);
	});

	it('changeScene and removeScene leave the other scenes untouched', () => {
		const changed = changeScene(three, uuid(2), { title: 'Other' });
		expect(changed.scenes[1].title).toBe('Other');
		expect(changed.scenes[0]).toBe(three.scenes[0]);
		expect(order(removeScene(three, uuid(2)))).toEqual([uuid(1), uuid(3)]);
	});

	it('sceneRanges are the limits of the document', () => {
		const probe = (key: keyof typeof sceneRanges, value: number) => {
			const scene = makeScene(1);
			const document = { ...three, scenes: [scene] };
			if (key === 'targetMinutes') document.targetMinutes = value;
			else if (key === 'haloFactor' || key === 'starFactor')
				scene.mix = { ...scene.mix, [key]: value };
			else if (key === 'rate') scene.motion = { ...scene.motion, rate: value };
			else if (key === 'seconds') scene.pace = { kind: 'timed', seconds: value };
			else if (key === 'fade') scene.entrance = { kind: 'fade', seconds: value };
			else if (key === 'ring') scene.drawings = { ...scene.drawings, rings: [value] };
			else scene.view = { ...scene.view, [key]: value };
			return showDocumentSchema.safeParse(document).success;
		};
		for (const key of Object.keys(sceneRanges) as (keyof typeof sceneRanges)[]) {
			const { min, max } = sceneRanges[key];
			expect([key, probe(key, min), probe(key, max)]).toEqual([key, true, true]);
			expect([key, probe(key, min - 0.01), probe(key, max + 0.01)]).toEqual([key, false, false]);
		}
	});
});
