import ExcelJS from 'exceljs';

/** Everything here is invented for the tests; no laboratory measured it. */
export interface InventedPoint {
  /** °C */
  readonly temperature: number;
  /** kPa */
  readonly pressure: number;
  /** cm²/s */
  readonly diffusivity: number;
}

const D0_CM2_S = 0.0931;
const EXPONENT = 1.78;
/** In percent, so that the points scatter as their stated 1 % says. */
const SCATTER = [0.4, -0.7, 0.9, -0.2, -1.1, 0.6, 0.3, -0.5, 0.8];

/** Nine points between 15 °C and 95 °C that lie about an invented power law. */
export const INVENTED_POINTS: readonly InventedPoint[] = SCATTER.map((percent, i) => {
  const temperature = 15 + 10 * i;
  const pressure = 101.3 - 0.1 * (i % 3);
  const law = D0_CM2_S * ((temperature + 273.15) / 298.15) ** EXPONENT * (101.325 / pressure);
  return { temperature, pressure, diffusivity: Number((law * (1 + percent / 100)).toFixed(4)) };
});

/** The point of the workbook in which the decimal sign slipped by one place. */
export const SLIPPED = 4;

/** A workbook as a laboratory keeps one: a title, a header with units, and one slip of the decimal sign. */
export async function inventedWorkbook(): Promise<Buffer> {
  const workbook = new ExcelJS.Workbook();
  const sheet = workbook.addWorksheet('invented');
  sheet.addRow(['Nr.', 'T / °C', 'p / kPa', 'D / (cm²/s)', 'u(D) / %']);
  INVENTED_POINTS.forEach(({ temperature, pressure, diffusivity }, i) => {
    const written = i === SLIPPED ? Number((10 * diffusivity).toFixed(3)) : diffusivity;
    sheet.addRow([i + 1, temperature, pressure, written, 1]);
  });
  return Buffer.from(await workbook.xlsx.writeBuffer());
}
