/** Tells the sides apart in words, colour and line. */
export function Legend() {
  return (
    <ul className="pointer-events-none absolute right-3 bottom-2 flex gap-4 text-ink-soft text-xs">
      <li className="side-key side-key-left">left</li>
      <li className="side-key side-key-right">right</li>
      <li className="side-key side-key-centre">centre</li>
    </ul>
  );
}
