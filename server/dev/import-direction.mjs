import { dirname, relative, resolve } from 'node:path';
import { root } from './paths.mjs';

const aliases = { '@shared/': 'shared/', '@catalog/': 'catalog/', '@server/': 'server/' };
const frameworks = /^(vue|vuetify|pinia|@pinia|vue-router|express|sequelize|mariadb|chart\.js)(\/|$)/;

/** Who may import whom, most particular folder first; a folder that is not listed may import anything. */
const directions = [
  { from: 'shared/engine/', may: ['shared/engine/'], packages: () => false },
  {
    from: 'shared/',
    may: ['shared/'],
    packages: (name) => !name.startsWith('node:') && !frameworks.test(name),
  },
  { from: 'catalog/', may: ['catalog/', 'shared/'], packages: () => true },
  { from: 'src/', may: ['src/', 'shared/'], packages: (name) => !name.startsWith('node:') },
  { from: 'server/', may: ['server/', 'shared/', 'catalog/'], packages: () => true },
];

/** The imported file's path from the root of the checkout, or undefined for a package. */
function pathOf(specifier, importer) {
  const alias = Object.keys(aliases).find((prefix) => specifier.startsWith(prefix));
  if (alias) return aliases[alias] + specifier.slice(alias.length);
  if (specifier.startsWith('/')) return specifier.slice(1);
  return specifier.startsWith('.') ? relative(root, resolve(root, dirname(importer), specifier)) : undefined;
}

function featureFault(importer, target) {
  const own = /^server\/features\/([^/]+)\//.exec(importer)?.[1];
  const [, other, file] = /^server\/features\/([^/]+)\/(.+)$/.exec(target) ?? [];
  if (!own || !other || own === other || /^(service\/|(.*-)?service\.ts$)/.test(file)) return undefined;
  return `Feature "${own}" may use only the service of feature "${other}", not its ${file}.`;
}

/** The sentence that says what is wrong with an import, or undefined when nothing is. */
export function importFault(importer, specifier) {
  const direction = directions.find(({ from }) => importer.startsWith(from));
  const target = pathOf(specifier, importer);
  if (!direction) return undefined;
  if (target === undefined) {
    return direction.packages(specifier)
      ? undefined
      : `Nothing in ${direction.from} may import "${specifier}".`;
  }
  if (!direction.may.some((folder) => target.startsWith(folder))) {
    return `Nothing in ${direction.from} may import from ${target}; it may import from ${direction.may.join(', ')}.`;
  }
  if (specifier.startsWith('.') && target.split('/')[0] !== importer.split('/')[0]) {
    return `Name another top-level folder by its alias: "@${target}".`;
  }
  return featureFault(importer, target);
}

/** ESLint rule over every form of import, type-only ones too. */
export const importDirection = {
  meta: { type: 'problem', schema: [] },
  create(context) {
    const importer = relative(root, context.filename);
    const check = (node) => {
      const source = node.source ?? node.argument;
      const specifier = source?.value ?? source?.literal?.value;
      const message = typeof specifier === 'string' ? importFault(importer, specifier) : undefined;
      if (message) context.report({ node, message });
    };
    return {
      ImportDeclaration: check,
      ExportNamedDeclaration: check,
      ExportAllDeclaration: check,
      ImportExpression: check,
      TSImportType: check,
    };
  },
};
