/**
 * Two laboratories on helium–carbon dioxide, as [T in K, D in m²/s at 101 325 Pa].
 *
 * Source: E. N. Fuller, P. D. Schettler, J. C. Giddings, *Ind. Eng. Chem.* 58(5) (1966) 18, Table III,
 * doi:10.1021/ie50677a007; the rows of its references 25 and 53. Its authors put the typical experimental error at 5 %.
 */
export const fullerReference25 = [
  [276.2, 5.312e-5],
  [317.2, 6.607e-5],
  [346.2, 7.646e-5],
] as const;

export const fullerReference53 = [
  [298.2, 6.12e-5],
  [323.2, 6.78e-5],
  [353.2, 8e-5],
  [383.2, 8.84e-5],
  [413.2, 1.04e-4],
  [443.2, 1.133e-4],
  [473.2, 1.279e-4],
  [498.2, 1.414e-4],
] as const;

/**
 * Source: B. E. Poling, J. M. Prausnitz, J. P. O'Connell, *The Properties of Gases and Liquids*, 5th ed., McGraw-Hill 2001,
 * Table 11-2, printed as D·P in cm²·bar/s: 0.620 at 298 K and 1.433 at 498 K; here at 100 000 Pa.
 */
export const polingTable11 = [
  [298, 6.2e-5],
  [498, 1.433e-4],
] as const;
