import type { Recipe } from '@/app/api/v1/_contracts/recipe';
import type { Version } from '@/app/api/v1/_contracts/version';

export interface TitleStripProps {
  readonly recipe: Recipe;
  readonly version: Version;
  readonly isChanged: boolean;
  readonly findings: string;
}

/** The title block at the foot of the sheet: what this is, in which state, by whom and when. */
export function TitleStrip({ recipe, version, isChanged, findings }: TitleStripProps) {
  const cells: readonly (readonly [label: string, value: string])[] = [
    ['Show', recipe.show.title],
    ['Recipe', recipe.name],
    ['Version', `${version.number}${isChanged ? ', changed' : ''}`],
    ['State', isChanged ? 'draft' : version.state],
    ['Hash', version.contentHash.slice(0, 12)],
    ['Drawn by', version.author.name],
    ['Date (UTC)', version.createdAt.slice(0, 16).replace('T', ' ')],
    ['Findings', findings],
  ];
  return (
    <dl className="title-strip" aria-label="Title block">
      {cells.map(([label, value]) => (
        <div key={label} className="title-cell">
          <dt>{label}</dt>
          <dd className="figures">{value}</dd>
        </div>
      ))}
    </dl>
  );
}
