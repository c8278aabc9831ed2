import type { Rule } from '../Rule';

/** Collections whose ids people write elsewhere. */
const COLLECTIONS = [
  'params',
  'landmarks',
  'roles',
  'containers',
  'parts',
  'chains',
  'controls',
  'solvers',
  'constraints',
  'drivers',
] as const;

/** What a person remembers of a name: neither underscores nor zeros before a number. */
function remembered(name: string): string {
  return name.replaceAll('_', '').replace(/(^|\D)0+(?=\d)/g, '$1');
}

/** Names that differ in an underscore or a zero only are confused by whoever did not write them. */
export const namesNearlySame: Rule = {
  code: 'names-nearly-same',
  severity: 'warning',
  category: 'tidiness',
  summary: 'Two names that differ in an underscore or a leading zero only.',
  message: '"{name}" can hardly be told from "{other}".',
  help: 'Rename one of them so that the two say how they differ.',
  create({ report, stage, recipe }) {
    return {
      finish() {
        for (const collection of COLLECTIONS) {
          const first = new Map<string, string>();
          for (const name of Object.keys(recipe[collection] ?? {})) {
            const key = remembered(name);
            const other = first.get(key);
            first.set(key, other ?? name);
            if (other === undefined) continue;
            const related = [
              { span: stage.document.spanAt([collection, other], 'key'), label: 'the name like it' },
            ];
            report([collection, name], { name, other }, { part: 'key', related });
          }
        }
      },
    };
  },
};
