import { doubt, type Issue } from '../issues.js';
import type { Expectation } from './context.js';
import { type Judged, short } from './judged.js';

/** Points at one temperature: replicates, which never fall against each other. */
interface Group {
  /** ln T */
  x: number;
  /** mean of ln(D P) */
  y: number;
  /** relative standard uncertainty of one point */
  u: number;
  rows: number[];
}

/** Temperatures closer than this count as one, K. */
const SAME_TEMPERATURE = 0.05;
/** The exponent with which D P rises where a point has a neighbour on one side only (Fuller, Schettler & Giddings 1966). */
const USUAL_EXPONENT = 1.75;
/** In standard uncertainties of the difference between a point and the line through its neighbours. */
const DOUBTFUL_FROM = 2;

/**
 * Where D P falls although T rises: the point of the two that lies farther from the line through its neighbours is
 * doubtful, when it does so by more than twice the uncertainty of that difference.
 */
export function fallingDoubts(judged: Judged, { usualRelativeUncertainty }: Expectation): Issue[] {
  const column = judged.columnOf('DIFFUSIVITY');
  const groups = groupsOf(judged, usualRelativeUncertainty);
  const doubtful = new Map<Group, number>();
  for (let g = 1; g < groups.length; g++) {
    const [before, here] = [groups[g - 1], groups[g]];
    if (!before || !here || here.y >= before.y) continue;
    const culprit = Math.abs(offLine(groups, g)) >= Math.abs(offLine(groups, g - 1)) ? g : g - 1;
    const off = offLine(groups, culprit);
    const group = groups[culprit];
    // The line through two neighbours of the same quality adds half of their variance.
    if (group && Math.abs(off) > DOUBTFUL_FROM * Math.sqrt(1.5) * group.u) doubtful.set(group, off);
  }
  return [...doubtful].flatMap(([group, off]) => group.rows.map((i) => ask(judged, { i, column, off, u: group.u })));
}

function ask(judged: Judged, { i, column, off, u }: { i: number; column: number; off: number; u: number }): Issue {
  const percent = short(Math.abs(100 * Math.expm1(off)));
  const side = off < 0 ? 'below' : 'above';
  const message = `D falls against rising T here: ${percent} % ${side} the line through its neighbours, ${short(Math.abs(off) / u)} u.`;
  return doubt('FALLS_WITH_TEMPERATURE', judged.place(i, column), message, {
    choices: [{ id: 'KEEP', label: 'keep, it is measured' }],
  });
}

function groupsOf(judged: Judged, usual: number): Group[] {
  const order = judged.complete
    .filter((i) => !judged.far[i])
    .sort((a, b) => judged.temperatureAt(a) - judged.temperatureAt(b));
  const groups: Group[] = [];
  let first = Number.NEGATIVE_INFINITY;
  for (const i of order) {
    const last = groups.at(-1);
    if (last && judged.temperatureAt(i) - first < SAME_TEMPERATURE) {
      last.y += (logDP(judged, i) - last.y) / (last.rows.length + 1);
      last.rows.push(i);
    } else {
      first = judged.temperatureAt(i);
      groups.push({ x: Math.log(first), y: logDP(judged, i), u: judged.relativeUncertaintyAt(i, usual), rows: [i] });
    }
  }
  return groups;
}

const logDP = (judged: Judged, i: number): number => Math.log(judged.diffusivityAt(i) * judged.pressureAt(i));

/** ln(D P) of a group less what the line through its neighbours has there. */
function offLine(groups: readonly Group[], g: number): number {
  const [before, here, after] = [groups[g - 1], groups[g], groups[g + 1]];
  if (!here) return 0;
  if (before && after) return here.y - before.y - ((after.y - before.y) * (here.x - before.x)) / (after.x - before.x);
  const beside = before ?? after;
  return beside ? here.y - beside.y - USUAL_EXPONENT * (here.x - beside.x) : 0;
}
