/**
 * Closed forms for a Lambertian line source, after Keitz (1971) as given in the IOA World Congress
 * proceedings 2007, p. 1396, generalised to any receiver direction and any stretch of the tube.
 *
 * Frame: f is the foot of the perpendicular from the receiver to the tube's line, D its length, l the
 * signed distance along the tube from f, r² = D² + l². The direction cosine to the element at l is
 * (A + B·l)/r with A = n·(f−p), B = n·u, and sin θ = D/r. `strength` is Φ/(π² L).
 *
 * All differences are taken factored, so that short stretches and far receivers keep their digits.
 */

/** Below this ratio of D to the distance along the axis, the near-axis series is exact to rounding. */
const NEAR_AXIS = 1e-3;

/**
 * Planar irradiance (W/m²) from the stretch l0..l1, on which A + B·l must not be negative.
 *
 *   E = strength · ∫ D (A + B l) / r⁴ dl
 *     = strength · [ A (l/(2 D r²) + atan(l/D)/(2 D²)) − B D/(2 r²) ]
 */
export function planarStretch(
  strength: number,
  A: number,
  B: number,
  D: number,
  l0: number,
  l1: number,
): number {
  const d2 = D * D;
  const r0 = d2 + l0 * l0;
  const r1 = d2 + l1 * l1;
  const span = l1 - l0;
  const along = (B * D * span * (l1 + l0)) / (2 * r0 * r1);
  if (A === 0) return strength * along;
  return strength * (A * D * inverseFourth(d2, D, l0, l1, r0, r1) + along);
}

/**
 * ∫ r⁻⁴ dl = [ l/(2 D² r²) + atan(l/D)/(2 D³) ], the two arctangents joined as
 * φ₁ − φ₀ = atan2((l₁−l₀) D, D² + l₀ l₁). Close to the axis both terms cancel; there
 * r⁻⁴ = l⁻⁴ (1 − 2 D²/l² + 3 D⁴/l⁴ − …) is integrated instead.
 */
function inverseFourth(d2: number, D: number, l0: number, l1: number, r0: number, r1: number): number {
  const nearest = Math.min(Math.abs(l0), Math.abs(l1));
  if (l0 * l1 > 0 && D < NEAR_AXIS * nearest) return seriesTo(l0, d2) - seriesTo(l1, d2);
  const span = l1 - l0;
  const rational = (span * (d2 - l0 * l1)) / (r0 * r1);
  return (rational + Math.atan2(span * D, d2 + l0 * l1) / D) / (2 * d2);
}

function seriesTo(l: number, d2: number): number {
  const q = d2 / (l * l);
  return (1 / 3 - q * (2 / 5 - q * (3 / 7 - (q * 4) / 9))) / (l * l * l);
}

/**
 * Fluence rate (W/m²), no cosine at the receiver:
 *
 *   E = strength · ∫ D / r³ dl = strength · [ l / (D r) ]
 *
 * When both ends lie on one side, sin φ₁ − sin φ₀ = D² (l₁² − l₀²) / ((l₁ r₀ + l₀ r₁) r₀ r₁).
 */
export function sphericalStretch(strength: number, D: number, l0: number, l1: number): number {
  const r0 = Math.sqrt(D * D + l0 * l0);
  const r1 = Math.sqrt(D * D + l1 * l1);
  if (l0 * l1 > 0) return (strength * D * (l1 - l0) * (l1 + l0)) / ((l1 * r0 + l0 * r1) * r0 * r1);
  return (strength * (l1 / r1 - l0 / r0)) / D;
}
