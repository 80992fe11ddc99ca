/** The part of jstat that the tests compare with; the package brings no types. */
declare module 'jstat' {
  interface Distributions {
    hypgeom: { cdf(found: number, lot: number, nonconforming: number, sample: number): number };
    binomial: { cdf(found: number, sample: number, fraction: number): number };
  }
  const distributions: Distributions;
  export = distributions;
}
