import fc from 'fast-check';
import type { Expectation } from './doubts/context.js';
import type { Decisions, Issue } from './issues.js';
import type { ColumnMapping, TableMapping } from './mapping.js';
import { recognise } from './recognise.js';
import type { RawTable } from './table.js';
import { readText } from './text/read-text.js';
import { understand, type Understood } from './understand.js';

const tableOf = (text: string): Promise<RawTable> =>
  readText(async function* () {
    yield await Promise.resolve(Buffer.from(text));
  });

/** Near ethanol in nitrogen by Fuller, Schettler & Giddings: 0.126 cm²/s at 298.15 K and 101.325 kPa. */
const EXPECTED: Expectation = {
  estimate: (temperature, pressure) => 1.26e-5 * (temperature / 298.15) ** 1.75 * (101_325 / pressure),
  estimateLabel: 'Fuller–Schettler–Giddings',
  usualRelativeUncertainty: 0.015,
};

interface Asked {
  decisions?: Decisions;
  expectation?: Expectation;
  change?: (mapping: TableMapping) => void;
}

async function understood(
  text: string,
  { decisions = {}, expectation = EXPECTED, change }: Asked = {},
): Promise<Understood> {
  const table = await tableOf(text);
  const { mapping } = recognise(table);
  change?.(mapping);
  return understand(table, mapping, decisions, expectation);
}

const brief = (issues: readonly Issue[]): string[] =>
  issues.map(({ code, row, column }) => [code, row ?? '–', column ?? '–'].join(' '));

const HEADER = 'T / °C;p / kPa;D / cm²/s\n';
const GOOD =
  '25,0;101,3;0,1249\n30,1;101,3;0,1279\n35,0;101,2;0,1325\n40,0;101,1;0,1369\n45,1;101,4;0,1393\n50,0;101,4;0,1441\n';

describe('a good table', () => {
  it('becomes points in SI, exactly', async () => {
    const { points, issues, isComplete } = await understood(HEADER + GOOD);

    expect(issues).toEqual([]);
    expect(isComplete).toBe(true);
    expect(points[0]).toEqual({
      row: 2,
      temperature: 298.15,
      pressure: 101_300,
      diffusivity: 1.249e-5,
      diffusivityUncertainty: null,
      temperatureUncertainty: null,
      pressureUncertainty: null,
      moleFraction: null,
      replicates: null,
    });
  });

  it('gives back every number it was made from, in whatever units and decimal sign', async () => {
    const row = fc.record({
      celsius: fc.integer({ min: 0, max: 2000 }).map((n) => n / 10),
      mmHg: fc.integer({ min: 7000, max: 8000 }).map((n) => n / 10),
      cm2: fc.integer({ min: 1000, max: 9999 }).map((n) => n / 10_000),
    });
    await fc.assert(
      fc.asyncProperty(
        fc.array(row, { minLength: 1, maxLength: 8 }),
        fc.constantFrom(',', '.'),
        async (rows, decimal) => {
          const withSign = (n: number): string => n.toFixed(4).replace('.', decimal);
          const lines = rows.map(({ celsius, mmHg, cm2 }) => [celsius, mmHg, cm2].map(withSign).join('\t'));
          const { points } = await understood(`T/°C\tp/mmHg\tD/cm²/s\n${lines.join('\n')}`, {
            decisions: { DUPLICATE_ROW: 'KEEP' },
          });
          expect(points.map(({ temperature }) => temperature)).toEqual(
            rows.map(({ celsius }) => Number((celsius + 273.15).toFixed(4))),
          );
          points.forEach(({ diffusivity, pressure }, i) => {
            expect(diffusivity).toBe(Number(`${(rows[i]?.cm2 ?? 0).toFixed(4)}e-4`));
            expect(pressure / 133.322387415).toBeCloseTo(rows[i]?.mmHg ?? 0, 9);
          });
        },
      ),
      { numRuns: 50 },
    );
  });

  it('takes replicates, the same T and P with another D, without a word', async () => {
    const { issues, points } = await understood(`${HEADER}${GOOD}25,0;101,3;0,1262\n25,0;101,3;0,1236\n`);

    expect(issues).toEqual([]);
    expect(points).toHaveLength(8);
  });

  it('takes one pressure for all rows', async () => {
    const { points } = await understood('T/K,D/m2/s\n298.15,1.249e-5\n', {
      change: (mapping) => {
        mapping.pressure = { value: 1, unit: 'atm' };
        mapping.pressureOrigin = 'ASSIGNED';
      },
    });

    expect(points[0]).toMatchObject({ pressure: 101_325 });
  });
});

describe('uncertainties', () => {
  const withColumn = (header: string, cell: string): string =>
    `T/K,p/Pa,D/cm2/s,${header}\n300,101325,0.2,${cell}\n310,101325,0.21,${cell}\n`;
  const ofTheLast =
    (change: (column: ColumnMapping) => void) =>
    (mapping: TableMapping): void => {
      const last = mapping.columns.at(-1);
      if (last) change(last);
    };

  it.each([
    ['u(D) / cm²/s', '0.003', 3e-7],
    ['u(D) / %', '1.5', 3e-7],
    ['U(D) (k=2) / %', '3', 3e-7],
    ['U(D) / cm²/s', '0.006', 3e-7],
  ])('stated as “%s” %s become standard and absolute', async (header, cell, uncertainty) => {
    const { points } = await understood(withColumn(header, cell));

    expect(points[0]?.diffusivityUncertainty).toBeCloseTo(uncertainty, 20);
  });

  it('of T take the size of a degree and not its zero', async () => {
    const { points } = await understood(withColumn('u(T) / °C', '0.05'));

    expect(points[0]?.temperatureUncertainty).toBe(0.05);
  });

  it('common to the series belong to it and weight no point', async () => {
    const result = await understood(withColumn('u(D) / %', '1.5'), {
      change: ofTheLast((column) => {
        column.uncertainty = { kind: 'STANDARD', coverageFactor: 1, scope: 'COMMON' };
      }),
    });

    expect(result.commonRelativeUncertainty).toBeCloseTo(0.015, 15);
    expect(result.points[0]?.diffusivityUncertainty).toBeNull();
  });

  it('called common but different from row to row are refused', async () => {
    const { issues } = await understood('T/K,p/Pa,D/cm2/s,u(D)/%\n300,101325,0.2,1.5\n310,101325,0.21,2\n', {
      change: ofTheLast((column) => {
        column.uncertainty = { kind: 'STANDARD', coverageFactor: 1, scope: 'COMMON' };
      }),
    });

    expect(brief(issues)).toEqual(['COMMON_VARIES – 3']);
  });

  it('stated once hold for the rows whose cell is empty', async () => {
    const { points } = await understood('T/K,p/Pa,D/cm2/s,u(D)/%\n300,101325,0.2,1\n310,101325,0.21,\n', {
      change: (mapping) => {
        mapping.diffusivityUncertainty = {
          value: 4,
          unit: '%',
          reading: { kind: 'EXPANDED', coverageFactor: 2, scope: 'INDEPENDENT' },
        };
      },
    });

    expect(points.map((point) => (point.diffusivityUncertainty ?? 0) / point.diffusivity)).toEqual([0.01, 0.02]);
  });
});

describe('bad input', () => {
  it.each([
    ['text in a number', 'about 30;101,3;0,128', 'TEXT_IN_NUMBER 8 0', '“about 30” is not a number.'],
    ['a unit in a cell', '30 °C;101,3;0,128', 'TEXT_IN_NUMBER 8 0', '“30 °C” is not a number.'],
    ['zero T', '-273,15;101,3;0,128', 'NOT_POSITIVE 8 0', 'must be above absolute zero'],
    ['zero P', '30;0;0,128', 'NOT_POSITIVE 8 1', 'The pressure must be above zero; 0 kPa is not.'],
    ['negative P', '30;-101,3;0,128', 'NOT_POSITIVE 8 1', '-101,3 kPa is not'],
    ['zero D', '30;101,3;0', 'NOT_POSITIVE 8 2', 'The diffusivity must be above zero; 0 cm²/s is not.'],
    ['negative D', '30;101,3;−0,128', 'NOT_POSITIVE 8 2', 'must be above zero'],
    ['a missing D', '30;101,3;', 'MISSING_VALUE 8 2', 'Row 8 has no diffusivity.'],
    ['a D said to be absent', '30;101,3;n/a', 'MISSING_VALUE 8 2', 'Row 8 has no diffusivity.'],
  ])('%s is refused at its cell', async (_, row, place, message) => {
    const { issues, isComplete } = await understood(`${HEADER}${GOOD}${row}\n`);

    expect(brief(issues)).toEqual([place]);
    expect(issues[0]?.severity).toBe('REFUSAL');
    expect(issues[0]?.message).toContain(message);
    expect(isComplete).toBe(false);
  });

  it.each([
    ['a missing column', 'T / °C;D / cm²/s\n25;0,12\n', ['MISSING_COLUMN – –']],
    ['a unit nobody knows', 'T / °C;p / kPa;D [furlong]\n25;101;0,12\n', ['UNKNOWN_UNIT – 2']],
    ['a unit of another quantity', 'T / °C;p / cm²/s;D / cm²/s\n25;101;0,12\n', ['WRONG_UNIT – 1']],
    ['a header and nothing else', 'T / °C;p / kPa;D / cm²/s\n', ['NO_ROWS – –']],
    ['no unit at all', 'T / K;p / kPa;D\n298;101;0,12\n', ['UNIT_GUESSED – 2']],
  ])('%s is told at its column', async (_, text, places) => {
    const { issues, isComplete } = await understood(text);

    expect(brief(issues)).toEqual(places);
    expect(isComplete).toBe(false);
  });

  it('in two columns of one quantity is refused', async () => {
    const { issues } = await understood(HEADER + GOOD, {
      change: (mapping) => {
        mapping.columns[1] = { ...mapping.columns[0]! };
        mapping.pressure = { value: 1, unit: 'atm' };
      },
    });

    expect(brief(issues)).toEqual(['COLUMN_TWICE – 1']);
  });

  it.each([
    [{ value: 0, unit: 'atm' }, 'must be above zero'],
    [{ value: 1, unit: 'K' }, '“K” is not a unit of pressure.'],
  ])('in the pressure of all rows (%j) is refused', async (pressure, message) => {
    const { issues } = await understood(HEADER + GOOD, { change: (mapping) => (mapping.pressure = pressure) });

    expect(issues[0]?.message).toContain(message);
  });

  it('is settled by leaving its row out', async () => {
    const result = await understood(`${HEADER}${GOOD}mean;101,3;0,134\n`, {
      decisions: { 'TEXT_IN_NUMBER:8:0': 'LEAVE_OUT' },
    });

    expect(result).toMatchObject({ isComplete: true, states: [...Array<string>(6).fill('KEPT'), 'LEFT_OUT'] });
    expect(result.points).toHaveLength(6);
  });

  it('is not settled by a choice that is not offered', async () => {
    const { isComplete } = await understood(`${HEADER}${GOOD}30;-1;0,13\n`, {
      decisions: { 'NOT_POSITIVE:8:1': 'KEEP' },
    });

    expect(isComplete).toBe(false);
  });

  it('never leaves nothing to keep', async () => {
    const { issues, isComplete } = await understood(`${HEADER}25;-1;0,12\n`, {
      decisions: { NOT_POSITIVE: 'LEAVE_OUT' },
    });

    expect(brief(issues)).toContain('NO_ROWS – –');
    expect(isComplete).toBe(false);
  });
});

describe('doubts', () => {
  /** The example of the guide: one cell in hPa, one in K, one D that falls, one row twice, one shifted decimal sign. */
  const GUIDE = `Nr.;T / °C;p / kPa;D / cm²/s;u(D) / %;N;Datum
1;25,0;101,3;0,1249;1,5;3;27.02.2019
2;30,1;101,3;0,1279;1,5;3;28.02.2019
3;35,0;101,2;0,1325;1,5;3;01.03.2019
4;40,0;101,1;0,1369;1,5;3;04.03.2019
5;45,1;101,4;0,1393;1,5;3;05.03.2019
6;50,0;1014;0,1441;1,5;3;06.03.2019
7;323,2;101,2;0,1437;1,5;2;07.03.2019
8;55,0;101,3;0,1414;1,5;3;08.03.2019
9;60,0;101,0;0,1522;1,5;3;11.03.2019
10;60,0;101,0;0,1522;1,5;3;11.03.2019
11;65,1;101,2;0,1561;1,5;3;12.03.2019
12;70,0;101,3;1,598;1,5;3;13.03.2019
`;

  it.each([
    ['with an estimate of the pair', EXPECTED],
    ['without one', { ...EXPECTED, estimate: null, estimateLabel: null }],
  ])('mark the cells of the guide and no others, %s', async (_, expectation) => {
    const { issues } = await understood(GUIDE, { expectation });

    expect(brief(issues)).toEqual([
      'UNIT_OF_CELL 7 2',
      'UNIT_OF_CELL 8 1',
      'FALLS_WITH_TEMPERATURE 9 3',
      'DUPLICATE_ROW 11 –',
      'DECIMAL_SHIFT 13 3',
    ]);
    expect(issues.every(({ severity }) => severity === 'DOUBT')).toBe(true);
  });

  it('say why, and what may be done', async () => {
    const { issues } = await understood(GUIDE);

    expect(issues.map(({ message }) => message)).toEqual([
      '10.01 times its neighbours; in hPa it would be 101.4 kPa.',
      'Looks like K in a column of °C; it would be 50.05 °C.',
      expect.stringMatching(
        /^D falls against rising T here: 4\.\d+ % below the line through its neighbours, 2\.\d+ u\.$/,
      ),
      'The same as row 10 in every column; nothing is wrong with the cells.',
      expect.stringMatching(/^(?:9\.\d+|10(?:\.\d+)?) times what its neighbours suggest; a shifted decimal sign\?$/),
    ]);
    expect(issues[4]?.choices).toEqual([
      { id: 'READ_AS', label: 'read as 0.1598' },
      { id: 'KEEP', label: 'keep 1,598 cm²/s' },
      { id: 'LEAVE_OUT', label: 'leave the row out' },
    ]);
  });

  it('are settled by what the person chooses', async () => {
    const result = await understood(GUIDE, {
      decisions: {
        'UNIT_OF_CELL:7:2': 'READ_AS',
        'UNIT_OF_CELL:8:1': 'READ_AS',
        FALLS_WITH_TEMPERATURE: 'KEEP',
        DUPLICATE_ROW: 'LEAVE_OUT',
        'DECIMAL_SHIFT:13:3': 'READ_AS',
      },
    });

    expect(result.isComplete).toBe(true);
    expect(result.points).toHaveLength(11);
    expect(result.points[5]).toMatchObject({ row: 7, pressure: 101_400 });
    expect(result.points[6]).toMatchObject({ row: 8, temperature: 323.2 });
    expect(result.points[10]).toMatchObject({ row: 13, diffusivity: 1.598e-5 });
  });

  it('stay open until every one is decided', async () => {
    const { isComplete, states } = await understood(GUIDE, {
      decisions: { UNIT_OF_CELL: 'READ_AS', DUPLICATE_ROW: 'KEEP' },
    });

    expect(isComplete).toBe(false);
    expect(states.filter((state) => state === 'OPEN')).toHaveLength(2);
  });

  it('arise about a whole column whose unit is off by 10^4', async () => {
    const text = (HEADER + GOOD).replace('D / cm²/s', 'D / m²/s');
    const { issues } = await understood(text);

    expect(brief(issues)).toEqual(['UNIT_OFF – 2']);
    expect(issues[0]?.message).toMatch(
      /With the diffusivity in m²\/s, D is 9\d+ times the estimate .*; in cm²\/s it would agree\./,
    );

    const settled = await understood(text, { decisions: { UNIT_OFF: 'READ_AS' } });
    expect(settled.isComplete).toBe(true);
    expect(settled.points[0]?.diffusivity).toBe(1.249e-5);
  });

  it('arise about a whole column of °C read as K', async () => {
    const { issues } = await understood((HEADER + GOOD).replace('T / °C', 'T / K'));

    expect(brief(issues)).toEqual(['UNIT_OFF – 0']);
    expect(issues[0]).toMatchObject({ readAs: { unit: '°C' } });
  });

  it('arise about a cell in m²/s in a column of cm²/s', async () => {
    const { issues } = await understood(`${HEADER}${GOOD}55,0;101,3;0,0000148\n`);

    expect(brief(issues)).toEqual(['UNIT_OF_CELL 8 2']);
    expect(issues[0]?.choices[0]).toEqual({ id: 'READ_AS', label: 'read as m²/s' });
  });

  it('arise about a D that is 3 interquartile ranges from the estimate', async () => {
    const { issues } = await understood(`${HEADER}${GOOD}55,0;101,3;0,1705\n`);

    expect(brief(issues)).toEqual(['FAR_FROM_ESTIMATE 8 2']);
    expect(issues[0]?.message).toContain('Fuller–Schettler–Giddings');
  });

  it('arise where no unit explains how far D is from the estimate', async () => {
    const { issues } = await understood('T/K;p/kPa;D/cm²/s\n300;101,3;4,0\n310;101,3;4,2\n');

    expect(brief(issues)).toEqual(['FAR_FROM_ESTIMATE – 2']);
  });

  it('arise where a sign may stand before decimals or thousands', async () => {
    const { issues, isComplete } = await understood('T/K;p/hPa;D/cm²/s\n300.5;1,013;0.12\n', {
      decisions: { DECIMAL_OR_THOUSANDS: 'KEEP' },
    });

    expect(brief(issues)).toEqual(['DECIMAL_OR_THOUSANDS 2 1']);
    expect(isComplete).toBe(true);
  });

  it('do not arise about a series over a wide range of T and P', async () => {
    const rows = [200, 300, 400, 600, 800, 1000, 1200].map(
      (t, i) =>
        `${t},${[10, 50, 100, 200, 300, 400, 100][i]},${(0.126 * (t / 298.15) ** 1.75 * 101.325) / ([10, 50, 100, 200, 300, 400, 100][i] ?? 1)}`,
    );

    expect((await understood(`T/K,p/kPa,D/cm2/s\n${rows.join('\n')}\n`)).issues).toEqual([]);
  });
});

describe('cells of a workbook', () => {
  const table: RawTable = {
    origin: 'WORKBOOK',
    columnCount: 3,
    decimal: '.',
    decimalCertain: true,
    encoding: null,
    delimiter: null,
    sheet: 'a',
    sheets: ['a'],
    rows: [
      { number: 1, cells: ['T/K', 'p/Pa', 'D/m2/s'] },
      { number: 2, cells: [300, 101_325, 1.26e-5], marks: [{ column: 2, kind: 'FORMULA', detail: 'B2*2' }] },
      { number: 3, cells: [310, 101_325, null], marks: [{ column: 2, kind: 'FORMULA', detail: 'B3*2' }] },
      { number: 4, cells: [320, 101_325, '#DIV/0!'], marks: [{ column: 2, kind: 'ERROR', detail: '#DIV/0!' }] },
      { number: 5, cells: [330, 101_325, '2019-05-01'], marks: [{ column: 2, kind: 'DATE', detail: '2019-05-01' }] },
      { number: 6, cells: [340, 101_325, 'TRUE'], marks: [{ column: 2, kind: 'BOOLEAN', detail: '1' }] },
    ],
  };

  it('with formulas, errors, dates and truth values are told apart', () => {
    const { issues } = understand(table, recognise(table).mapping, {}, EXPECTED);

    expect(brief(issues)).toEqual([
      'FORMULA 2 2',
      'FORMULA_WITHOUT_RESULT 3 2',
      'CELL_ERROR 4 2',
      'DATE_IN_NUMBER 5 2',
      'TEXT_IN_NUMBER 6 2',
    ]);
    expect(issues[0]).toMatchObject({ severity: 'DOUBT', suggested: 'KEEP' });
  });

  it('with a formula keep the result that the workbook holds, once the person says so', () => {
    const result = understand(
      { ...table, rows: table.rows.slice(0, 2) },
      recognise(table).mapping,
      { FORMULA: 'KEEP' },
      EXPECTED,
    );

    expect(result).toMatchObject({ isComplete: true, points: [{ diffusivity: 1.26e-5 }] });
  });
});
