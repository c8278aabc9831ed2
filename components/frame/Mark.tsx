/** The mark: a pin between two leaves of a hinge, as it would be dimensioned on a drawing. */
export function Mark({ size = 26 }: { readonly size?: number }) {
  return (
    <svg width={size} height={size} viewBox="0 0 26 26" aria-hidden="true" focusable="false">
      <path d="M1.5 8.5h7v9h-7M24.5 8.5h-7v9h7" fill="none" stroke="currentColor" strokeWidth="1.5" />
      <path d="M13 1v24" stroke="currentColor" strokeWidth="1" strokeDasharray="5 2 1.5 2" />
      <circle cx="13" cy="13" r="4.5" fill="none" stroke="var(--signal)" strokeWidth="2" />
    </svg>
  );
}
