import type { Locator, Page } from '@playwright/test';

/** What the stage of the dome says about one moment of its picture. */
export interface Reading {
	/** 1/60 s since the run began. */
	tick: number;
	/** Radians that the ring at 8 kpc has turned. */
	phase: number;
	/** km/s/kpc. */
	omega: number;
	/** Most by which an event has come after it was due, ms. */
	late: number;
}

/** Watches the stage and keeps every moment it tells, read in one go so that they belong together. */
export async function watchStage(dome: Page): Promise<() => Promise<Reading[]>> {
	await dome.evaluate(() => {
		const stage = document.querySelector<HTMLElement>('[data-stage]');
		const seen: Record<string, string>[] = [];
		const look = () => seen.push({ ...(stage?.dataset as Record<string, string>) });
		const observer = new MutationObserver(look);
		if (stage) observer.observe(stage, { attributes: true, attributeFilter: ['data-tick'] });
		Object.assign(window, { seenReadings: seen });
	});
	return () =>
		dome.evaluate(() =>
			(window as unknown as { seenReadings: Record<string, string>[] }).seenReadings
				.filter((r) => r.ringPhase !== undefined)
				.map((r) => ({
					tick: Number(r.tick),
					phase: Number(r.ringPhase),
					omega: Number(r.ringOmega),
					late: Number(r.late)
				}))
		);
}

/** One moment, read in one go. */
export const readingOf = (stage: Locator): Promise<Reading> =>
	stage.evaluate(({ dataset }: HTMLElement) => ({
		tick: Number(dataset.tick),
		phase: Number(dataset.ringPhase),
		omega: Number(dataset.ringOmega),
		late: Number(dataset.late)
	}));

/** A number among the stage's attributes, by its name without `data-`. */
export const numberOf = async (stage: Locator, name: string): Promise<number> =>
	Number(await stage.getAttribute(`data-${name}`));

/** Every pixel of what is drawn and written over the stars, as one text that can be compared. */
export const drawnOver = (stage: Locator): Promise<string> =>
	stage
		.locator('canvas')
		.last()
		.evaluate((canvas: HTMLCanvasElement) => canvas.toDataURL());

/**
 * Whether the stars are painted: pixels of the film brighter than a dim background star, at most
 * as many as are sampled.
 */
export const starlight = (stage: Locator): Promise<number> =>
	stage
		.locator('canvas')
		.first()
		.evaluate((canvas: HTMLCanvasElement) => {
			const small = Object.assign(document.createElement('canvas'), { width: 256, height: 256 });
			const context = small.getContext('2d');
			if (!context) throw new Error('this browser gives no 2D context');
			context.drawImage(canvas, 0, 0, 256, 256);
			const { data } = context.getImageData(0, 0, 256, 256);
			return data.filter((value, i) => i % 4 === 0 && value > 40).length;
		});
