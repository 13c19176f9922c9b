import path from 'node:path';

/** The engine's folders, lowest first: a folder imports itself and what stands before it. */
export const LAYERS = [
  'quantity',
  'stack',
  'material',
  'job',
  'laminate',
  'tube',
  'buckling',
  'limit',
  'sizing',
  'report',
  'figure',
  'memo',
];

/** The packages that the engine may use: pure ones, that touch neither machine nor screen. */
const ENGINE_PACKAGES = ['canonicalize', '@noble/hashes/sha2.js', '@noble/hashes/utils.js'];

/** The parts of the tree that each part may import; what is not listed here (test, tooling) may import everything. */
const REACH = {
  src: ['src'],
  main: ['main', 'src', 'assets'],
  renderer: ['renderer', 'src', 'assets'],
};

const CONTRACT = 'main/contract';
const REPORT_TYPES = 'src/report/report';

const withoutExtension = (file) => file.replace(/\.(ts|js|vue|json)$/, '');

/** Why an engine file may not import another engine file, or null where it may. */
function refusalInsideEngine(from, to, isType) {
  if (isType && to === REPORT_TYPES) return null;
  const [, source, ...sourceRest] = from.split('/');
  const [, target, ...targetRest] = to.split('/');
  if (targetRest.length === 0) return `src/${target} is the engine's public list: only others import it`;
  if (!LAYERS.includes(target)) return `src/${target} is not a layer of the engine`;
  if (sourceRest.length === 0) return null;
  if (!LAYERS.includes(source)) return `src/${source} is not a layer of the engine`;
  if (LAYERS.indexOf(target) <= LAYERS.indexOf(source)) return null;
  return `${source} stands below ${target} and may not import it`;
}

/** Why a file may not import a file of this tree, or null where it may; paths from the root, with no extension. */
function refusalInTree(from, to, isType) {
  const source = from.split('/')[0];
  const target = to.split('/')[0];
  if (!Object.hasOwn(REACH, source)) return null;
  if (source === 'renderer' && to === CONTRACT && isType) return null;
  if (!REACH[source].includes(target)) return `${source} may not import ${target}`;
  return source === 'src' ? refusalInsideEngine(from, to, isType) : null;
}

/**
 * Why `file` may not import `specifier`, or null where it may.
 *
 * @param {string} file path from the root of the tree, with slashes
 * @param {string} specifier as the import writes it
 * @param {boolean} isType whether it is a whole `import type`, which leaves nothing to run
 * @returns {string | null} one sentence without its full stop
 */
export function refusal(file, specifier, isType) {
  if (specifier.startsWith('.')) {
    const target = path.posix.normalize(path.posix.join(path.posix.dirname(file), specifier));
    return refusalInTree(withoutExtension(file), withoutExtension(target), isType);
  }
  if (!file.startsWith('src/') || ENGINE_PACKAGES.includes(specifier)) return null;
  return `the engine is pure and may not import ${specifier}`;
}

/**
 * Lint rule: every import keeps to the layers.
 *
 * @type {import('eslint').Rule.RuleModule}
 */
const layers = {
  meta: { type: 'problem', schema: [], messages: { refused: '{{why}}.' } },
  create(context) {
    const file = path.relative(context.cwd, context.filename).split(path.sep).join('/');
    const check = (node, source, isType) => {
      if (typeof source?.value !== 'string') return;
      const why = refusal(file, source.value, isType);
      if (why !== null) context.report({ node, messageId: 'refused', data: { why } });
    };
    return {
      ImportDeclaration: (node) => check(node, node.source, node.importKind === 'type'),
      ExportAllDeclaration: (node) => check(node, node.source, node.exportKind === 'type'),
      ExportNamedDeclaration: (node) => check(node, node.source, node.exportKind === 'type'),
      ImportExpression: (node) => check(node, node.source, false),
      TSImportType: (node) => check(node, node.source ?? node.argument?.literal, true),
    };
  },
};

/** @type {import('eslint').ESLint.Plugin} */
const plugin = { rules: { layers } };

export default plugin;
