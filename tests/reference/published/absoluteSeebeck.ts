/*
 * Absolute Seebeck coefficients, µV/K, T in kelvin, 70 K < T < 1000 K. Source: interpolation formulas of Burkov et
 * al., Meas. Sci. Technol. 12 (2001) 264, as coded in a public repository; the paper itself was not at hand.
 */
function copper(kelvin: number): number {
  return 0.041 * kelvin * (Math.exp(-kelvin / 93) + 0.123 - 0.442 / (1 + (kelvin / 172.4) ** 3)) + 0.804
}

function platinum(kelvin: number): number {
  return 0.186 * kelvin * (Math.exp(-kelvin / 88) - 0.0786 + 0.43 / (1 + (kelvin / 84.3) ** 4)) - 2.57
}

const INTERVALS = 200

/** emf of copper against platinum from 0 °C, mV: the difference of both coefficients summed by Simpson's rule. */
export function copperAgainstPlatinum(celsius: number): number {
  const step = celsius / INTERVALS
  let sum = 0
  for (let i = 0; i <= INTERVALS; i++) {
    const kelvin = 273.15 + i * step
    const weight = i === 0 || i === INTERVALS ? 1 : i % 2 === 1 ? 4 : 2
    sum += weight * (copper(kelvin) - platinum(kelvin))
  }
  return ((sum * step) / 3) * 1e-3
}
