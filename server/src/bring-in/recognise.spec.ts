import { recognise } from './recognise.js';
import type { RawTable } from './table.js';
import { readText } from './text/read-text.js';

const tableOf = (text: string): Promise<RawTable> =>
  readText(async function* () {
    yield await Promise.resolve(Buffer.from(text));
  });

const columnsOf = async (text: string): Promise<string[]> =>
  recognise(await tableOf(text)).mapping.columns.map(({ role, unit, unitOrigin }) =>
    unit === null ? role : `${role} ${unit} ${unitOrigin}`,
  );

describe('recognising a table', () => {
  it('finds a header with units', async () => {
    const { mapping } = recognise(await tableOf('T / °C;p / kPa;D / cm²/s\n25;101,3;0,1249\n30;101,3;0,1281\n'));

    expect(mapping).toMatchObject({ headerRow: 1, unitRow: null, decimal: ',', pressureOrigin: 'STATED' });
    expect(mapping.columns.map(({ role, unit }) => [role, unit])).toEqual([
      ['TEMPERATURE', '°C'],
      ['PRESSURE', 'kPa'],
      ['DIFFUSIVITY', 'cm²/s'],
    ]);
  });

  it('finds a row of units below the names, and titles above them', async () => {
    const text =
      'Notebook 7\nethanol in nitrogen\n\nNr.,T,P,D,uD\n,[K],(mmHg),cm^2 s-1,%\n1,298.15,760,0.1249,1.5\n2,303.15,760,0.128,1.5\n';
    const { mapping } = recognise(await tableOf(text));

    expect(mapping).toMatchObject({ headerRow: 4, unitRow: 5 });
    expect(mapping.columns.map(({ role, unit }) => [role, unit])).toEqual([
      ['ROW_NUMBER', null],
      ['TEMPERATURE', 'K'],
      ['PRESSURE', 'mmHg'],
      ['DIFFUSIVITY', 'cm²/s'],
      ['DIFFUSIVITY_UNCERTAINTY', '%'],
    ]);
  });

  it('reads the table of the guide: bare names, a ±, counts and dates', async () => {
    const text =
      'Nr.\tT\tp\tD\t±\tN\tDatum\n1\t25,0\t101,3\t0,1249\t1,5\t3\t27.02.2019\n2\t30,1\t101,3\t0,1279\t1,5\t3\t28.02.2019\n';

    expect(await columnsOf(text)).toEqual([
      'ROW_NUMBER',
      'TEMPERATURE °C GUESSED',
      'PRESSURE kPa GUESSED',
      'DIFFUSIVITY cm²/s GUESSED',
      'DIFFUSIVITY_UNCERTAINTY % GUESSED',
      'REPLICATES',
      'DATE',
    ]);
  });

  it('gives an uncertainty without a unit that of its quantity, when that makes it small', async () => {
    expect(await columnsOf('T/K,D (cm2/s),u(D)\n298.15,0.1249,0.0019\n')).toEqual([
      'TEMPERATURE K STATED',
      'DIFFUSIVITY cm²/s STATED',
      'DIFFUSIVITY_UNCERTAINTY cm²/s STATED',
    ]);
  });

  it('takes columns without a header by their place, to be confirmed', async () => {
    expect(await columnsOf('298.15,101325,1.249e-5\n303.15,101325,1.28e-5\n')).toEqual([
      'TEMPERATURE K GUESSED',
      'PRESSURE Pa GUESSED',
      'DIFFUSIVITY m²/s GUESSED',
    ]);
  });

  it('takes only the first of two columns of one quantity, and says nothing of remarks', async () => {
    expect(await columnsOf('T/°C,T/K,D/cm2/s,remark\n25,298.15,0.1249,fine\n')).toEqual([
      'TEMPERATURE °C STATED',
      'IGNORED',
      'DIFFUSIVITY cm²/s STATED',
      'IGNORED',
    ]);
  });

  it('gives a reason for each column', async () => {
    const { reasons } = recognise(await tableOf('T,D [furlong2],remark\n298.15,0.1249,fine\n'));

    expect(reasons).toEqual([
      'the header names the temperature; no unit stated; K by the size of the numbers',
      'the header names the diffusivity; its unit is not known',
      'names no quantity',
    ]);
  });
});
