export const consoleThemes = ['amber', 'plain', 'red'] as const;
export type ConsoleTheme = (typeof consoleThemes)[number];

const themeKey = 'farwheel.console.theme';
const shortcutsKey = 'farwheel.console.shortcuts';

/** What a presenter sets for this device: it stays in its browser. */
export class ConsoleSettings {
	#theme = $state<ConsoleTheme>('amber');
	#shortcuts = $state(true);

	/** Reads what was set before; to be called in the browser. */
	load(): void {
		const theme = consoleThemes.find((known) => known === localStorage.getItem(themeKey));
		if (theme) this.#theme = theme;
		this.#shortcuts = localStorage.getItem(shortcutsKey) !== 'off';
	}

	get theme(): ConsoleTheme {
		return this.#theme;
	}
	set theme(theme: ConsoleTheme) {
		this.#theme = theme;
		localStorage.setItem(themeKey, theme);
	}

	/** Whether single keys are commands. */
	get shortcuts(): boolean {
		return this.#shortcuts;
	}
	set shortcuts(on: boolean) {
		this.#shortcuts = on;
		localStorage.setItem(shortcutsKey, on ? 'on' : 'off');
	}
}
