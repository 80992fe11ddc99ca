/** Both scales are exact: 5 °C are 9 °F, and 0 °C is 32 °F. */
const CELSIUS_PER_FAHRENHEIT = 5 / 9;
const ICE_F = 32;

/** A temperature in °F to °C, exact: 212 °F is 100 °C. */
export const celsiusFromFahrenheit = (temperatureF: number): number =>
  (temperatureF - ICE_F) * CELSIUS_PER_FAHRENHEIT;

/** A temperature in °C to °F, exact: 100 °C is 212 °F. */
export const fahrenheitFromCelsius = (temperatureC: number): number =>
  temperatureC / CELSIUS_PER_FAHRENHEIT + ICE_F;

/** A difference of temperatures in °F to °C, exact: a rise of 18 °F is a rise of 10 °C. */
export const celsiusDifferenceFromFahrenheit = (differenceF: number): number =>
  differenceF * CELSIUS_PER_FAHRENHEIT;

/** A difference of temperatures in °C to °F, exact: a band of 10 °C is a band of 18 °F. */
export const fahrenheitDifferenceFromCelsius = (differenceC: number): number =>
  differenceC / CELSIUS_PER_FAHRENHEIT;
