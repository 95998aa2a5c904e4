/** The letter of a series by its place among all series of its pair, from 0: a to z, then aa, ab, … */
export function seriesLetter(place: number): string {
  const letter = String.fromCharCode(97 + (place % 26));
  return place < 26 ? letter : seriesLetter(Math.floor(place / 26) - 1) + letter;
}
