import { buildFiles, compile, samples } from '@/compiler';

/** Prints what the process takes the place and time zone to be, then the hash of every file of every sample's build. */
const { locale, timeZone } = Intl.DateTimeFormat().resolvedOptions();
const lines = [`${locale} ${timeZone}`];
for (const { id, text } of samples) {
  const compilation = compile({ recipe: { name: `${id}.recipe.yaml`, text } });
  for (const { name, sha256 } of await buildFiles(compilation)) lines.push(`${name} ${sha256}`);
}
process.stdout.write(`${lines.join('\n')}\n`);
