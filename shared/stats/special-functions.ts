// eslint-disable-next-line @typescript-eslint/triple-slash-reference -- every project that imports this file needs the types
/// <reference path="./jstat.d.ts" />
import jStat from 'jstat'

/**
 * What the distribution files take from jstat (1.9.6): the incomplete beta function and its inverse, the lower
 * incomplete gamma, log-gamma, and `ptukey`. One place, so that its accuracy is looked after in one place.
 */
export const { ibeta, ibetainv, lowRegGamma, gammaln, tukey } = jStat
