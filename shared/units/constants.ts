/** Exact conversion factors to SI. Sources: SI brochure, 9th ed.; international yard and pound agreement of 1959; international nautical mile of 1929. */

/** one knot, m/s */
export const KN_MS = 1852 / 3600
/** one kilometre per hour, m/s */
export const KMH_MS = 1 / 3.6
/** one statute mile per hour, m/s */
export const MPH_MS = 0.44704
/** one foot, m */
export const FT_M = 0.3048
/** one inch, m */
export const IN_M = 0.0254
/** one pound, kg */
export const LB_KG = 0.45359237
/** standard gravity, m/s2 */
export const G = 9.80665
/** one pound-force, N */
export const LBF_N = LB_KG * G
/** one kilogram-force, N */
export const KGF_N = G
/** one degree, rad */
export const DEG_RAD = Math.PI / 180
