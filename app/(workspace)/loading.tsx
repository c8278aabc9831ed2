/** Shown while a page is being made. */
export default function Loading() {
  return (
    <p className="sheet text-ink-soft" role="status">
      Fetching the sheet…
    </p>
  );
}
