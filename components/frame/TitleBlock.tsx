export interface TitleBlockProps {
  readonly cells: readonly (readonly [label: string, value: string])[];
}

/** The title block at the foot of a sheet: what this is, in which state, by whom and when. */
export function TitleBlock({ cells }: TitleBlockProps) {
  return (
    <dl className="title-block" aria-label="Title block">
      {cells.map(([label, value]) => (
        <div key={label} className="title-cell">
          <dt>{label}</dt>
          <dd className="figures">{value}</dd>
        </div>
      ))}
    </dl>
  );
}
