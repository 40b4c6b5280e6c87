/** Where somebody in a seat looks, and how wide. Kept within what a head can do. */
export class SeatLook {
	/** Degrees to the right of front. */
	azimuth = $state(0);
	/** Degrees up. */
	altitude = $state(35);
	/** Degrees from top to bottom of the picture. */
	field = $state(70);

	turn(right: number, up: number): void {
		this.azimuth = ((this.azimuth + right + 540) % 360) - 180;
		this.altitude = Math.min(90, Math.max(-20, this.altitude + up));
	}

	/** @param factor below 1 looks closer */
	widen(factor: number): void {
		this.field = Math.min(110, Math.max(20, this.field * factor));
	}

	reset(): void {
		this.azimuth = 0;
		this.altitude = 35;
		this.field = 70;
	}

	/** Arrow keys turn by 5°, plus and minus change the field, Home looks to the front. @returns whether it was such a key */
	key(key: string): boolean {
		const turns: Record<string, () => void> = {
			ArrowLeft: () => this.turn(-5, 0),
			ArrowRight: () => this.turn(5, 0),
			ArrowUp: () => this.turn(0, 5),
			ArrowDown: () => this.turn(0, -5),
			'+': () => this.widen(0.9),
			'=': () => this.widen(0.9),
			'-': () => this.widen(1 / 0.9),
			Home: () => this.reset()
		};
		turns[key]?.();
		return key in turns;
	}
}
