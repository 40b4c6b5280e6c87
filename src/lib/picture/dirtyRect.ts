/** A rectangle of film pixels that grows with what is painted. Empty where right < left. */
export interface DirtyRect {
	left: number;
	top: number;
	/** Inclusive. */
	right: number;
	bottom: number;
}

export const emptyRect = (): DirtyRect => ({ left: 1e9, top: 1e9, right: -1, bottom: -1 });

export function clearRect(rect: DirtyRect): void {
	rect.left = rect.top = 1e9;
	rect.right = rect.bottom = -1;
}

export function setRect(rect: DirtyRect, from: DirtyRect): void {
	rect.left = from.left;
	rect.top = from.top;
	rect.right = from.right;
	rect.bottom = from.bottom;
}

/** Widens `rect` to hold `other` too. */
export function joinRect(rect: DirtyRect, other: DirtyRect): void {
	rect.left = Math.min(rect.left, other.left);
	rect.top = Math.min(rect.top, other.top);
	rect.right = Math.max(rect.right, other.right);
	rect.bottom = Math.max(rect.bottom, other.bottom);
}
