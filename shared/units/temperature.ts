/** °F from °C, and back. Exact by definition. */
export const fahrenheitFromCelsius = (celsius: number): number => celsius * 1.8 + 32;
export const celsiusFromFahrenheit = (fahrenheit: number): number => (fahrenheit - 32) / 1.8;
