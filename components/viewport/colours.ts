/** The page's colours as hexadecimal text, read from the custom properties of the scheme that is on. */
export interface Colours {
  readonly paper: string;
  readonly sheet: string;
  readonly ink: string;
  readonly inkSoft: string;
  readonly rule: string;
  readonly signal: string;
  readonly left: string;
  readonly right: string;
  readonly centre: string;
  readonly error: string;
  readonly warning: string;
  readonly info: string;
}

const PROPERTIES: Readonly<Record<keyof Colours, string>> = {
  paper: '--paper',
  sheet: '--sheet',
  ink: '--ink',
  inkSoft: '--ink-soft',
  rule: '--rule',
  signal: '--signal',
  left: '--left',
  right: '--right',
  centre: '--centre',
  error: '--error',
  warning: '--warning',
  info: '--info',
};

/** Reads the colours from the page; call it in the browser only. */
export function readColours(): Colours {
  const style = getComputedStyle(document.documentElement);
  const read = (property: string): string => style.getPropertyValue(property).trim();
  return Object.fromEntries(
    Object.entries(PROPERTIES).map(([name, property]) => [name, read(property)]),
  ) as unknown as Colours;
}

/** Whether the scheme that is on has a dark ground, told from the ground itself. */
export function isNightScheme(): boolean {
  const { sheet } = readColours();
  const value = Number.parseInt(sheet.slice(1), 16);
  const brightness = ((value >> 16) & 255) * 0.299 + ((value >> 8) & 255) * 0.587 + (value & 255) * 0.114;
  return brightness < 128;
}

/** Calls back whenever the scheme may have changed, by the page's switch or the system's; returns how to stop. */
export function onSchemeChange(callback: () => void): () => void {
  const observer = new MutationObserver(callback);
  observer.observe(document.documentElement, { attributes: true });
  const system = window.matchMedia('(prefers-color-scheme: dark)');
  system.addEventListener('change', callback);
  return () => {
    observer.disconnect();
    system.removeEventListener('change', callback);
  };
}
