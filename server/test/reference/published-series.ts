/** [T in K, D in m²/s at 101 325 Pa] */
export type PublishedPoint = readonly [number, number];

export interface PublishedSeries {
  readonly pair: string;
  readonly points: readonly PublishedPoint[];
}

/**
 * Measured diffusivities as compiled from the primary literature and reduced to one atmosphere.
 *
 * Source: E. N. Fuller, P. D. Schettler, J. C. Giddings, *Ind. Eng. Chem.* 58(5) (1966) 18, Table III,
 * doi:10.1021/ie50677a007; the compilers put the typical experimental error at the order of 5 %.
 */
export const fullerCompilation: readonly PublishedSeries[] = [
  {
    pair: 'hydrogen–nitrogen',
    points: [
      [193.0, 3.68e-5],
      [200.0, 4.01e-5],
      [253.0, 6e-5],
      [273.0, 7.08e-5],
      [287.5, 7.43e-5],
      [294.0, 7.63e-5],
      [297.2, 7.79e-5],
      [300.0, 8e-5],
      [303.5, 8.52e-5],
      [322.0, 9.03e-5],
      [398.0, 0.0001289],
      [400.0, 0.000127],
      [450.0, 0.0001541],
      [506.0, 0.0001883],
      [573.0, 0.0002417],
    ],
  },
  {
    pair: 'argon–hydrogen',
    points: [
      [287.9, 8.28e-5],
      [354.2, 0.0001111],
      [418.0, 0.0001714],
    ],
  },
  {
    pair: 'helium–nitrogen',
    points: [
      [293.0, 7.05e-5],
      [298.0, 7.3e-5],
      [298.0, 6.88e-5],
      [298.2, 6.87e-5],
      [298.2, 7.17e-5],
      [300.0, 7.43e-5],
      [323.2, 7.66e-5],
      [353.2, 8.93e-5],
      [383.2, 0.0001077],
      [413.2, 0.00012],
      [443.2, 0.0001289],
      [473.2, 0.0001569],
      [498.2, 0.000165],
      [600.0, 0.00024],
      [900.0, 0.000476],
      [1200.0, 0.000774],
    ],
  },
  {
    pair: 'helium–oxygen',
    points: [
      [298.2, 7.37e-5],
      [298.2, 7.18e-5],
      [323.2, 8.09e-5],
      [353.2, 9.87e-5],
      [383.2, 0.000112],
      [413.2, 0.0001245],
      [443.2, 0.000142],
      [473.2, 0.0001595],
      [498.2, 0.0001683],
    ],
  },
  {
    pair: 'helium–air',
    points: [
      [276.2, 6.242e-5],
      [317.2, 7.652e-5],
      [346.2, 9.019e-5],
    ],
  },
  {
    pair: 'helium–carbon dioxide',
    points: [
      [276.2, 5.312e-5],
      [298.2, 6.12e-5],
      [317.2, 6.607e-5],
      [323.2, 6.78e-5],
      [346.2, 7.646e-5],
      [353.2, 8e-5],
      [383.2, 8.84e-5],
      [413.2, 0.000104],
      [443.2, 0.0001133],
      [473.2, 0.0001279],
      [498.2, 0.0001414],
    ],
  },
  {
    pair: 'nitrogen–carbon dioxide',
    points: [
      [289.2, 1.58e-5],
      [293.0, 1.63e-5],
      [298.0, 1.65e-5],
      [298.0, 1.67e-5],
      [298.0, 1.67e-5],
      [298.2, 1.63e-5],
      [298.2, 1.81e-5],
      [300.0, 1.73e-5],
      [600.0, 6.05e-5],
      [900.0, 0.0001217],
      [1200.0, 0.0001976],
    ],
  },
  {
    pair: 'neon–argon',
    points: [
      [90.0, 3.6e-6],
      [194.5, 1.53e-5],
      [273.0, 2.71e-5],
      [273.0, 2.76e-5],
      [288.0, 3e-5],
      [303.0, 3.27e-5],
      [318.0, 3.57e-5],
      [353.0, 4.14e-5],
      [473.0, 6.71e-5],
    ],
  },
  {
    pair: 'argon–xenon',
    points: [
      [194.7, 5.08e-6],
      [273.2, 9.62e-6],
      [329.9, 1.366e-5],
      [378.0, 1.759e-5],
    ],
  },
  {
    pair: 'air–carbon dioxide',
    points: [
      [276.2, 1.42e-5],
      [293.0, 1.65e-5],
      [317.2, 1.772e-5],
    ],
  },
  {
    pair: 'nitrogen–water',
    points: [
      [307.6, 2.56e-5],
      [328.6, 3.03e-5],
      [352.2, 3.59e-5],
    ],
  },
  {
    pair: 'carbon dioxide–water',
    points: [
      [307.5, 2.02e-5],
      [328.6, 2.11e-5],
      [352.4, 2.45e-5],
    ],
  },
  {
    pair: 'air–water',
    points: [
      [298.2, 2.6e-5],
      [299.1, 2.58e-5],
      [312.6, 2.77e-5],
      [333.2, 3.05e-5],
    ],
  },
];
