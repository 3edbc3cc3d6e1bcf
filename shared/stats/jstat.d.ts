/** The part of jstat (1.9.6, no types of its own) that the distribution files here use. */
declare module 'jstat' {
  interface JStat {
    /** Regularised incomplete beta function I_x(a, b). */
    ibeta(x: number, a: number, b: number): number
    /** x with I_x(a, b) = p. */
    ibetainv(p: number, a: number, b: number): number
    /** Regularised lower incomplete gamma function P(a, x). */
    lowRegGamma(a: number, x: number): number
    gammaln(x: number): number
    readonly tukey: {
      cdf(q: number, means: number, df: number): number
      inv(p: number, means: number, df: number): number
    }
  }
  const jStat: JStat
  export default jStat
}
