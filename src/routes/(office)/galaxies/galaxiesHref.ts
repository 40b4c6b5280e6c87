import { links } from '$lib/links';

/** What the list shows, as it stands in the address. */
export interface ListAddress {
	search?: string;
	state?: string;
	sort?: string;
	order?: 'up' | 'down';
}

/** The address of the list; what is empty or usual is left out of it. */
export function galaxiesHref(address: ListAddress): string {
	const query = new URLSearchParams();
	for (const [key, value] of Object.entries(address)) {
		if (value && !(key === 'sort' && value === 'name' && !address.order)) query.set(key, value);
	}
	return query.size > 0 ? `${links.galaxies()}?${query}` : links.galaxies();
}
