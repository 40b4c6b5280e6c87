/** The part of the Keyboard Lock draft that is used here; not every browser has it. */
interface KeyboardLock {
	lock(keys: string[]): Promise<void>;
}

/**
 * Lets the page see Escape in full screen, so that it can ask before leaving. Where the browser
 * cannot do that, Escape leaves at once and the page offers the way back.
 */
export async function lockEscape(): Promise<void> {
	const { keyboard } = navigator as Navigator & { keyboard?: KeyboardLock };
	await keyboard?.lock(['Escape']).catch(() => null);
}
