import { documentVersion, showDocumentSchema, type ShowDocument } from './document';

/** Turns a document of one version into one of the next; keyed by the version it reads. */
type Upgrade = (document: Record<string, unknown>) => Record<string, unknown>;
const upgrades: ReadonlyMap<number, Upgrade> = new Map();

/**
 * Reads a stored show document of any version this program has written.
 * @throws Error naming the version, or the field and what is wrong with it
 */
export function readDocument(stored: unknown): ShowDocument {
	if (typeof stored !== 'object' || stored === null || !('version' in stored)) {
		throw new Error('This is not a show document: it has no version.');
	}
	let document: Record<string, unknown> = { ...stored };
	for (let version = document.version; version !== documentVersion; version = document.version) {
		const upgrade = typeof version === 'number' ? upgrades.get(version) : undefined;
		if (!upgrade)
			throw new Error(`Show documents of version ${String(version)} cannot be read here.`);
		document = upgrade(document);
	}
	const result = showDocumentSchema.safeParse(document);
	if (!result.success) {
		const [issue] = result.error.issues;
		throw new Error(`The show document is damaged at ${issue.path.join('.')}: ${issue.message}`);
	}
	return result.data;
}
