/** How to leave the text and get about by keyboard, in words. */
export function TextFoot() {
  return (
    <p className="text-foot">
      <span>
        <kbd>Ctrl M</kbd> lets Tab leave the text
      </span>
      <span>
        <kbd>Alt F8</kbd> next finding
      </span>
      <span>
        <kbd>Ctrl .</kbd> all commands
      </span>
    </p>
  );
}
