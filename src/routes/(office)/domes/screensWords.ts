/** Such as "2 paired, 1 in touch". */
export function screensWords(paired: number, inTouch: number): string {
	if (paired === 0) return 'none paired';
	return `${paired} paired, ${inTouch === paired ? 'in touch' : inTouch === 0 ? 'none in touch' : `${inTouch} in touch`}`;
}
