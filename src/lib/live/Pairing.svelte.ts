import { links } from '../links';
import { ask, asJson } from './ask';
import { pause } from './pause';

const pollMs = 1500;
const retryMs = 2000;

/** The code of an unpaired dome page: asked for, counted down, renewed by itself. */
export class Pairing {
	/** Null until the server has given one. */
	code = $state<string | null>(null);
	secondsLeft = $state(0);
	/** Whether the server answered last time. */
	reached = $state(true);

	/** Shows codes until one of them is typed. @returns true then, false once `signal` ends it */
	async run(signal: AbortSignal): Promise<boolean> {
		while (!signal.aborted) {
			const answer = await ask<{ code: string; claim: string; secondsLeft: number }>(
				links.apiPairing(),
				{ method: 'POST' }
			);
			this.reached = answer.body !== null;
			if (!answer.body) {
				this.code = null;
				await pause(retryMs, signal);
				continue;
			}
			this.code = answer.body.code;
			const { claim, secondsLeft } = answer.body;
			if (await this.#wait(claim, performance.now() + secondsLeft * 1000, signal)) return true;
		}
		return false;
	}

	/** Asks what became of a code until it is typed (true) or over (false). */
	async #wait(claim: string, end: number, signal: AbortSignal): Promise<boolean> {
		const countDown = () => {
			this.secondsLeft = Math.max(0, Math.ceil((end - performance.now()) / 1000));
		};
		countDown();
		const timer = setInterval(countDown, 250);
		try {
			while (!signal.aborted && performance.now() < end) {
				const answer = await ask<{ status: 'waiting' | 'expired' | 'paired' }>(
					links.apiClaim(),
					asJson('POST', { claim })
				);
				this.reached = answer.body !== null;
				if (answer.body?.status === 'paired') return true;
				if (answer.body?.status === 'expired') return false;
				await pause(pollMs, signal);
			}
			return false;
		} finally {
			clearInterval(timer);
		}
	}
}
