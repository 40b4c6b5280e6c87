/**
 * Keeps the display from going to sleep while the page is seen.
 * @returns the function that lets it sleep again
 */
export function keepAwake(): () => void {
	let lock: WakeLockSentinel | null = null;
	let over = false;
	async function ask(): Promise<void> {
		if (over || document.visibilityState !== 'visible' || !('wakeLock' in navigator)) return;
		// Refused to save power, for example: then the system's own setting decides.
		lock = await navigator.wakeLock.request('screen').catch(() => null);
		if (over) await lock?.release();
	}
	// The browser lets go whenever the page is hidden.
	document.addEventListener('visibilitychange', ask);
	void ask();
	return () => {
		over = true;
		document.removeEventListener('visibilitychange', ask);
		void lock?.release();
	};
}
