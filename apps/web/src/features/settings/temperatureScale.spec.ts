import { temperatureScale } from './temperatureScale';

describe('a temperature in the reader’s unit', () => {
  it('is kept in °C', () => {
    const { fromCelsius, toCelsius, min, max } = temperatureScale('fahrenheit');
    expect(fromCelsius(20)).toBe(68);
    expect(toCelsius(68)).toBe(20);
    expect([min, max]).toEqual([-4, 122]);
    expect(temperatureScale('celsius')).toMatchObject({ min: -20, max: 50 });
  });

  it('comes back as the whole degree that was typed', () => {
    const { fromCelsius, toCelsius } = temperatureScale('fahrenheit');
    for (let typed = -4; typed <= 122; typed++) expect(fromCelsius(toCelsius(typed))).toBeCloseTo(typed, 0);
  });
});
