import { describe, expect, it } from 'vitest';
import { ShowPicture } from '../../src/lib/picture/showPicture';
import { freshMotion, motionWith, scenePlayback } from '../../src/lib/show/editingPlayback';
import { makeContent, makeScene, uuid } from './support/content';

const scene = makeScene(1, { entrance: { kind: 'fade', seconds: 5 } });
const content = makeContent([scene]);

describe('scenePlayback', () => {
	it('shows the scene lit, with its entrance over', () => {
		const picture = new ShowPicture(content, { starCount: 50, ringCount: 16 });
		const frame = picture.frameAt(scenePlayback(content, freshMotion(scene)), {
			apertureDegrees: 180,
			tiltDegrees: 0
		});
		expect(frame.exposure).toBe(1);
		expect(frame.layers).toHaveLength(1);
	});

	it('a changed setting lets the stars go on from where they were', () => {
		const picture = new ShowPicture(content, { starCount: 50, ringCount: 64 });
		const before = { ...freshMotion(scene), ticks: 600 };
		const turned = picture.ringAt(scenePlayback(content, before), 8);
		const quicker = { ...scene, motion: { ...scene.motion, rate: 8 } };
		const after = motionWith(before, quicker);
		const now = picture.ringAt(scenePlayback(content, after), 8);
		expect(turned?.phase).toBeGreaterThan(0.1);
		expect(now?.phase).toBe(turned?.phase);
	});

	it('other words change nothing of the motion', () => {
		const before = { ...freshMotion(scene), ticks: 600 };
		expect(motionWith(before, { ...scene, script: 'Look.' })).toMatchObject({
			closed: null,
			ticks: 600
		});
	});

	it('another galaxy starts fresh', () => {
		const before = { ...freshMotion(scene), ticks: 600 };
		const other = makeScene(1, { subject: { kind: 'galaxy', galaxyId: uuid(901) } });
		expect(motionWith(before, other)).toEqual(freshMotion(other));
	});
});
