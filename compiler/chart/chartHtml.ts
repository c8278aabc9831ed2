import type { Rig } from '../rig/Rig';
import { type ChartValue, controlChart } from './controlChart';
import { frontPicture } from './frontPicture';

function escaped(text: string): string {
  return text
    .replaceAll('&', '&amp;')
    .replaceAll('<', '&lt;')
    .replaceAll('>', '&gt;')
    .replaceAll('"', '&quot;')
    .replaceAll("'", '&#39;');
}

function range({ min, max, unit, choices }: ChartValue): string {
  if (choices) return choices.map(escaped).join(', ');
  if (min === null && max === null) return unit === '' ? 'any' : `any ${unit}`;
  return `${min ?? '…'} to ${max ?? '…'} ${unit}`.trimEnd();
}

function valueRow(value: ChartValue): string {
  const note = value.note === null ? '' : ` <span class="note">${escaped(value.note)}</span>`;
  return `<li><b>${escaped(value.name)}</b> ${range(value)}${value.default === 0 ? '' : `, rests at ${value.default}`}${note}</li>`;
}

const STYLE = `
  @page { margin: 14mm }
  body { font: 10.5pt/1.45 sans-serif; color: #111; background: #fff; margin: 2rem auto; max-width: 60rem; padding: 0 1rem }
  h1 { font-size: 1.6rem; margin: 0 0 1rem }
  figure { margin: 0 0 1.5rem } figure svg { max-width: 100%; max-height: 24cm; height: auto }
  table { border-collapse: collapse; width: 100% } th, td { border-bottom: 1px solid #999; padding: .35rem .6rem .35rem 0; text-align: left; vertical-align: top }
  tr { break-inside: avoid } ul { margin: 0; padding: 0; list-style: none } .note { color: #444 } td:first-child { font-variant-numeric: tabular-nums }
  dl { display: grid; grid-template-columns: repeat(3, 1fr); border: 1.5px solid #111; margin: 1.5rem 0 0 } dl div { border-right: 1px solid #111; padding: .4rem .6rem } dl div:last-child { border: 0 }
  dt { font-size: .75rem; color: #444 } dd { margin: 0 }
  .wide { overflow-x: auto }`;

/**
 * The control chart as one HTML page without scripts or anything from elsewhere: a picture with numbered controls, what
 * each steers, its values and their ranges, and a title block. Prints on A4 and Letter. Every text is escaped.
 */
export function chartHtml(rig: Rig): string {
  const chart = controlChart(rig);
  const numbers = new Map(chart.entries.map(({ name, number }) => [name, number]));
  const rows = chart.entries.map(
    ({ number, id, side, steers, values }) =>
      `<tr><td>${number}</td><th scope="row">${escaped(id)}</th><td>${side}</td><td>${steers.map(escaped).join(', ')}</td><td><ul>${values.map(valueRow).join('')}</ul></td></tr>`,
  );
  const title = `Controls of ${escaped(chart.character)}`;
  return [
    '<!doctype html>',
    '<html lang="en">',
    `<head><meta charset="utf-8"><meta name="viewport" content="width=device-width, initial-scale=1"><title>${title}</title><style>${STYLE}</style></head>`,
    '<body>',
    `<h1>${title}</h1>`,
    `<figure role="img" aria-label="The rig at rest from the front, its controls numbered">${frontPicture(rig, { numbers })}</figure>`,
    '<div class="wide" tabindex="0" role="region" aria-label="Controls"><table>',
    '<thead><tr><th scope="col">No.</th><th scope="col">Control</th><th scope="col">Side</th><th scope="col">Steers</th><th scope="col">Values</th></tr></thead>',
    `<tbody>${rows.join('\n')}</tbody>`,
    '</table></div>',
    `<dl><div><dt>Character</dt><dd>${escaped(chart.character)}</dd></div><div><dt>Recipe</dt><dd>${escaped(chart.recipe)}</dd></div><div><dt>House rules</dt><dd>${escaped(chart.house)}</dd></div></dl>`,
    '</body>',
    '</html>',
    '',
  ].join('\n');
}
