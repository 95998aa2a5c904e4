import { type DemoPair, type DemoScenario, type DemoSeries } from './demo.types.js';
import { ETHANOL_NITROGEN_SERIES, ETHANOL_NITROGEN_SHEET } from './ethanol-nitrogen.js';
import { GAS_SERIES, GAS_SHEETS } from './gases.js';
import { GROUP, INSTRUMENTS, PEOPLE, STATEMENT } from './group.js';
import { demoTubeRuns } from './tube-runs.js';
import { VAPOUR_SERIES, VAPOUR_SHEETS } from './vapours.js';
import { WATER_AIR_SERIES, WATER_AIR_SHEET } from './water-air.js';

/** The demo scenario, whole and the same at every call. It knows no database: who writes it down drives the services. */
export function demoScenario(): DemoScenario {
  const series = [...ETHANOL_NITROGEN_SERIES, ...WATER_AIR_SERIES, ...GAS_SERIES, ...VAPOUR_SERIES];
  return {
    statement: STATEMENT,
    group: GROUP,
    people: PEOPLE,
    instruments: INSTRUMENTS,
    pairs: pairsOf(series),
    series,
    sheets: [ETHANOL_NITROGEN_SHEET, WATER_AIR_SHEET, ...GAS_SHEETS, ...VAPOUR_SHEETS],
    tubeRuns: demoTubeRuns(),
  };
}

/** Each pair once, in the order of its first series. */
function pairsOf(series: readonly DemoSeries[]): DemoPair[] {
  const pairs = new Map(series.map(({ a, b }) => [`${a}|${b}`, { a, b }]));
  return [...pairs.values()];
}
