/** Gauss–Kronrod pair of 7 and 15 points (Kronrod 1965; digits as in QUADPACK): nodes from the outermost in. */
const NODES = [
  0.9914553711208126, 0.9491079123427585, 0.8648644233597691, 0.7415311855993945, 0.5860872354676911,
  0.4058451513773972, 0.20778495500789848, 0,
] as const;
const KRONROD = [
  0.022935322010529224, 0.06309209262997856, 0.10479001032225019, 0.14065325971552592, 0.1690047266392679,
  0.19035057806478542, 0.20443294007529889, 0.20948214108472782,
] as const;
/** Weights of the odd nodes, which the 7-point rule shares. */
const GAUSS = [0.1294849661688697, 0.27970539148927664, 0.3818300505051189, 0.4179591836734694] as const;

/** Halvings allowed; a stretch 2⁻²⁴ of a leg carries no dose that counts. */
const DEEPEST = 24;

/**
 * ∫ f over from..to, split at `breaks` (any order, inside or not), until 7 and 15 points agree within `relative` of
 * the whole on every piece. f must be smooth between breaks for that to be quick; kinks only cost halvings.
 */
export function integrate(
  f: (t: number) => number,
  from: number,
  to: number,
  breaks: readonly number[],
  relative: number,
): number {
  const cuts = [from, ...breaks.filter((t) => t > from && t < to).sort((a, b) => a - b), to];
  const first = cuts.slice(1).map((end, i) => gaussKronrod(f, cuts[i], end));
  const whole = first.reduce((sum, { kronrod }) => sum + Math.abs(kronrod), 0);
  const allowed = relative * whole;
  return first.reduce((sum, piece, i) => sum + refine(f, cuts[i], cuts[i + 1], piece, allowed, DEEPEST), 0);
}

interface Estimate {
  readonly kronrod: number;
  readonly gauss: number;
}

function refine(
  f: (t: number) => number,
  from: number,
  to: number,
  estimate: Estimate,
  allowed: number,
  depth: number,
): number {
  if (depth === 0 || Math.abs(estimate.kronrod - estimate.gauss) <= allowed) return estimate.kronrod;
  const middle = (from + to) / 2;
  return (
    refine(f, from, middle, gaussKronrod(f, from, middle), allowed / 2, depth - 1) +
    refine(f, middle, to, gaussKronrod(f, middle, to), allowed / 2, depth - 1)
  );
}

function gaussKronrod(f: (t: number) => number, from: number, to: number): Estimate {
  const centre = (from + to) / 2;
  const half = (to - from) / 2;
  let kronrod = KRONROD[7] * f(centre);
  let gauss = (GAUSS[3] * kronrod) / KRONROD[7];
  for (let i = 0; i < 7; i++) {
    const pair = f(centre - half * NODES[i]) + f(centre + half * NODES[i]);
    kronrod += KRONROD[i] * pair;
    if (i % 2 === 1) gauss += GAUSS[(i - 1) / 2] * pair;
  }
  return { kronrod: kronrod * half, gauss: gauss * half };
}
