import type { UserSettings } from '@thudline/contracts';

const minC = -20;
const maxC = 50;

/** The reader's scale for a temperature that is kept in °C, with the contract's limits on it. */
export function temperatureScale(unit: UserSettings['temperatureUnit']) {
  const fahrenheit = unit === 'fahrenheit';
  const fromCelsius = (celsius: number) => (fahrenheit ? celsius * 1.8 + 32 : celsius);
  /** To a tenth: a whole degree Fahrenheit comes back as the same whole degree. */
  const toCelsius = (value: number) => Math.round((fahrenheit ? (value - 32) / 1.8 : value) * 10) / 10;
  return { fromCelsius, toCelsius, min: fromCelsius(minC), max: fromCelsius(maxC) };
}
