/** Numbers and times as they stand on the page: a real minus sign, a unit, no more digits than are true. */

export const missing = '–';

const minus = '\u2212';

export function number(value: number, digits = 1): string {
  const text = Math.abs(value).toFixed(digits);
  return value < 0 && Number(text) !== 0 ? minus + text : text;
}

/** A difference: always with its sign, except where it rounds to nothing. */
export function signed(value: number, digits = 1): string {
  const text = number(value, digits);
  return value > 0 && Number(text) !== 0 ? `+${text}` : text;
}

export const decibels = (value: number, digits = 1) => `${number(value, digits)} dB`;
export const signedDecibels = (value: number, digits = 1) => `${signed(value, digits)} dB`;
export const dbfs = (value: number, digits = 1) => `${number(value, digits)} dBFS`;
export const milliseconds = (value: number, digits = 1) => `${number(value, digits)} ms`;

/** 16.2 → "0:16"; with tenths "0:16.2". */
export function clock(seconds: number, tenths = false): string {
  const roundedS = tenths ? Math.round(seconds * 10) / 10 : Math.round(seconds);
  const minutes = Math.floor(roundedS / 60);
  const rest = roundedS - minutes * 60;
  return `${minutes}:${tenths ? rest.toFixed(1).padStart(4, '0') : String(rest).padStart(2, '0')}`;
}

/** A path difference in the reader's unit: always "about". */
export function distance(metres: number, unit: 'metre' | 'foot'): string {
  if (unit === 'foot') {
    const inches = Math.round(metres / 0.0254);
    const feet = Math.trunc(inches / 12);
    const rest = Math.abs(inches - feet * 12);
    return feet === 0 ? `${number(inches, 0)} in` : `${number(feet, 0)} ft ${rest} in`;
  }
  return Math.abs(metres) < 1 ? `${number(metres * 100, 0)} cm` : `${number(metres, 2)} m`;
}

export function temperature(celsius: number, unit: 'celsius' | 'fahrenheit'): string {
  return unit === 'celsius' ? `${number(celsius, 0)} °C` : `${number(celsius * 1.8 + 32, 0)} °F`;
}

/** 31.5 → "31.5", 1000 → "1k", 3150 → "3.15k". */
export function hertz(value: number): string {
  return value >= 1000 ? `${Number((value / 1000).toPrecision(3))}k` : String(Number(value.toPrecision(3)));
}

export function bytes(value: number): string {
  return value >= 1e6 ? `${(value / 1e6).toFixed(1)} MB` : `${Math.max(1, Math.round(value / 1e3))} kB`;
}

const dayAndTime = new Intl.DateTimeFormat('en-GB', {
  day: 'numeric',
  month: 'short',
  hour: '2-digit',
  minute: '2-digit',
});

const dayMonthYear = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'short', year: 'numeric' });

/** "2 Dec 2026" in the reader's time zone. */
export const date = (iso: string) => dayMonthYear.format(new Date(iso));

/** "2 Dec, 19:40" in the reader's time zone. */
export const dateTime = (iso: string) => dayAndTime.format(new Date(iso));

export const plural = (count: number, one: string, many = `${one}s`) =>
  `${count} ${count === 1 ? one : many}`;
