import { temperatureRamp, type Edition } from './theme/palette';

type Triple = readonly [number, number, number];

/**
 * The colour of a temperature in K: nine stops, mixed in OKLab so that equal steps look equal; the ends hold beyond the
 * domain. OKLab: Björn Ottosson, “A perceptual color space for image processing” (2020), as in CSS Color 4, section 9.
 */
export function temperatureColour(temperature: number, edition: Edition): string {
  const [low, high] = temperatureRamp.domain;
  const stops = temperatureRamp[edition];
  const place = Math.min(1, Math.max(0, (temperature - low) / (high - low))) * (stops.length - 1);
  const index = Math.min(stops.length - 2, Math.floor(place));
  const share = place - index;
  const from = toOklab(stops[index]!);
  const to = toOklab(stops[index + 1]!);
  return fromOklab([0, 1, 2].map((i) => from[i]! + (to[i]! - from[i]!) * share) as unknown as Triple);
}

const linear = (channel: number) => (channel <= 0.04045 ? channel / 12.92 : ((channel + 0.055) / 1.055) ** 2.4);
const gamma = (light: number) => (light <= 0.0031308 ? light * 12.92 : 1.055 * light ** (1 / 2.4) - 0.055);

function toOklab(hex: string): Triple {
  const [r = 0, g = 0, b = 0] = [1, 3, 5].map((at) => linear(Number.parseInt(hex.slice(at, at + 2), 16) / 255));
  const l = Math.cbrt(0.4122214708 * r + 0.5363325363 * g + 0.0514459929 * b);
  const m = Math.cbrt(0.2119034982 * r + 0.6806995451 * g + 0.1073969566 * b);
  const s = Math.cbrt(0.0883024619 * r + 0.2817188376 * g + 0.6299787005 * b);
  return [
    0.2104542553 * l + 0.793617785 * m - 0.0040720468 * s,
    1.9779984951 * l - 2.428592205 * m + 0.4505937099 * s,
    0.0259040371 * l + 0.7827717662 * m - 0.808675766 * s,
  ];
}

function fromOklab([L, a, b]: Triple): string {
  const l = (L + 0.3963377774 * a + 0.2158037573 * b) ** 3;
  const m = (L - 0.1055613458 * a - 0.0638541728 * b) ** 3;
  const s = (L - 0.0894841775 * a - 1.291485548 * b) ** 3;
  const channels = [
    4.0767416621 * l - 3.3077115913 * m + 0.2309699292 * s,
    -1.2684380046 * l + 2.6097574011 * m - 0.3413193965 * s,
    -0.0041960863 * l - 0.7034186147 * m + 1.707614701 * s,
  ];
  const hex = channels.map((light) =>
    Math.round(255 * Math.min(1, Math.max(0, gamma(Math.max(0, light)))))
      .toString(16)
      .padStart(2, '0'),
  );
  return `#${hex.join('')}`;
}
