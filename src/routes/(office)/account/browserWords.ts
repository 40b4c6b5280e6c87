const browsers: [RegExp, string][] = [
	[/Edg\//, 'Edge'],
	[/OPR\//, 'Opera'],
	[/Firefox\//, 'Firefox'],
	[/Chrom(e|ium)\//, 'Chrome'],
	[/Safari\//, 'Safari']
];
const systems: [RegExp, string][] = [
	[/Android/, 'Android'],
	[/iPhone|iPad/, 'iOS'],
	[/Windows/, 'Windows'],
	[/Mac OS X/, 'macOS'],
	[/Linux|X11/, 'Linux']
];

const named = (userAgent: string, names: [RegExp, string][]) =>
	names.find(([sign]) => sign.test(userAgent))?.[1];

/** What a user agent says, in words that tell one's own machines apart. */
export function browserWords(userAgent: string): string {
	const browser = named(userAgent, browsers) ?? 'Unknown browser';
	const system = named(userAgent, systems);
	return system ? `${browser} on ${system}` : browser;
}
