/** The state of a show in the list: what it has been frozen to, and whether work went on. */
export function stateWords(show: {
	archivedAt: Date | null;
	edition: number | null;
	changedSince: boolean;
}): string {
	if (show.archivedAt) return 'archived';
	if (show.edition === null) return 'draft';
	return `edition ${show.edition}${show.changedSince ? ', changed since' : ''}`;
}
