/**
 * The house order of src/lib: a folder may import only from folders of a lower floor
 * (folders on one floor do not see each other unless listed).
 * @type {Record<string, string[]>}
 */
const mayImport = {
	units: [],
	dynamics: ['units'],
	dome: ['units'],
	measurements: ['units', 'dynamics'],
	starfield: ['units', 'dynamics', 'dome'],
	show: ['units', 'dynamics', 'dome', 'measurements', 'starfield'],
	picture: ['units', 'dynamics', 'dome', 'measurements', 'starfield', 'show'],
	safety: ['units', 'dynamics', 'dome', 'measurements', 'starfield', 'show', 'picture']
};
const pure = new Set(Object.keys(mayImport));
const forbiddenPackages = [
	/^svelte/,
	/^three/,
	/^@threlte\//,
	/^\$app\//,
	/^\$env\//,
	/^drizzle-orm/,
	/^pg$/,
	/^node:/,
	/^@sveltejs\//,
	/^@auth\//
];
/** Rooms of one floor above the pure ones: none of them sees another. */
const upstairs = ['stage', 'live', 'components', 'server'];

/** @param {string} file @returns {string | null} the folder under src/lib that holds the file */
function roomOf(file) {
	const match = /src\/lib\/([^/]+?)(?:\.ts|\/|$)/.exec(file.replaceAll('\\', '/'));
	return match ? match[1] : null;
}

/** @param {string} file @param {string} specifier */
function resolve(file, specifier) {
	if (specifier.startsWith('$lib/')) return 'src/lib/' + specifier.slice(5);
	if (!specifier.startsWith('.')) return null;
	return new URL(specifier, 'file://' + file.replaceAll('\\', '/')).pathname;
}

/** @type {import('eslint').Rule.RuleModule} */
export const importsOneWay = {
	meta: {
		type: 'problem',
		docs: { description: 'imports point one way through the house' },
		schema: []
	},
	create(context) {
		const from = roomOf(context.filename);
		if (!from) return {};
		/** @param {import('estree').Node} node @param {unknown} specifier */
		function check(node, specifier) {
			if (typeof specifier !== 'string' || !from) return;
			const isPure = pure.has(from);
			if (isPure && forbiddenPackages.some((p) => p.test(specifier))) {
				context.report({ node, message: `${from} is a pure room and may not import ${specifier}` });
				return;
			}
			const target = resolve(context.filename, specifier);
			if (isPure && specifier.startsWith('$')) {
				context.report({
					node,
					message: `${from} is a pure room: import ${specifier} by a relative path`
				});
				return;
			}
			if (!target) return;
			if (/src\/routes\//.test(target)) {
				context.report({ node, message: 'src/lib may not import from routes' });
				return;
			}
			const to = roomOf(target);
			if (!to || to === from) return;
			if (isPure && !mayImport[from].includes(to)) {
				context.report({
					node,
					message: `${from} may not import from ${to}: imports point one way`
				});
			}
			if (upstairs.includes(from) && upstairs.includes(to)) {
				context.report({
					node,
					message: `${from} and ${to} stand on one floor: neither sees the other`
				});
			}
		}
		return {
			ImportDeclaration: (node) => check(node, node.source.value),
			ExportNamedDeclaration: (node) => node.source && check(node, node.source.value),
			ExportAllDeclaration: (node) => check(node, node.source.value),
			ImportExpression: (node) => node.source.type === 'Literal' && check(node, node.source.value)
		};
	}
};
