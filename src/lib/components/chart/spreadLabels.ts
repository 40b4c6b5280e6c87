/**
 * Places labels so that none is nearer than `gap` to the next: each as close to where it wants to be
 * as its neighbours allow, groups that touch sharing their displacement, all kept within the ends.
 * @param wanted positions in any order @returns positions in the same order
 */
export function spreadLabels(
	wanted: readonly number[],
	gap: number,
	low: number,
	high: number
): number[] {
	const order = wanted.map((_, i) => i).sort((a, b) => wanted[a] - wanted[b] || a - b);
	// A block is a run of labels that touch: its first place is the mean of what its members want.
	const blocks: { sum: number; members: number[] }[] = [];
	const start = ({ sum, members }: { sum: number; members: number[] }) =>
		Math.max(low, Math.min(high - gap * (members.length - 1), sum / members.length));
	for (const i of order) {
		let block = { sum: wanted[i], members: [i] };
		for (let last = blocks.at(-1); last; last = blocks.at(-1)) {
			const end = start(last) + gap * last.members.length;
			if (start(block) >= end) break;
			blocks.pop();
			const shift = gap * last.members.length * block.members.length;
			block = {
				sum: last.sum + block.sum - shift,
				members: [...last.members, ...block.members]
			};
		}
		blocks.push(block);
	}
	const placed = new Array<number>(wanted.length);
	for (const block of blocks) {
		block.members.forEach((i, k) => (placed[i] = start(block) + gap * k));
	}
	return placed;
}
