import { Circle, ClipPath, Defs, G, Line, Path, Polygon, Polyline, Rect, Svg, Text } from '@react-pdf/renderer';
import { createElement, type ComponentType, type ReactElement, type ReactNode } from 'react';
import { WORK_SANS } from './print-fonts.js';
import { parseSvg, type SvgNode } from './svg-tree.js';

type Attributes = Record<string, unknown>;

/** What ECharts draws with. An element of any other name would be lost, so it is refused. */
const ELEMENTS: Readonly<Record<string, ComponentType<Attributes>>> = {
  g: G,
  path: Path,
  rect: Rect,
  circle: Circle,
  line: Line,
  polyline: Polyline,
  polygon: Polygon,
  defs: Defs,
  clipPath: ClipPath,
  text: Text,
} as unknown as Readonly<Record<string, ComponentType<Attributes>>>;

const NO_DRAWING = new Set([
  'xmlns',
  'xmlns:xlink',
  'version',
  'baseProfile',
  'xml:space',
  'class',
  'style',
  'cursor',
  'pointer-events',
  'paint-order',
]);
const TEXT_ATTRIBUTES = new Set([
  'font-size',
  'font-family',
  'font-weight',
  'font-style',
  'dominant-baseline',
  'x',
  'y',
]);
const BACKGROUND_TAGS = new Set(['g', 'svg', 'defs', 'clipPath']);

/** A chart drawn by ECharts as vectors of the document. Width in pt. */
export function VectorChart({ svg, width }: { readonly svg: string; readonly width: number }): ReactElement {
  const root = parseSvg(svg);
  const [w, h] = [Number.parseFloat(root.attributes.width ?? ''), Number.parseFloat(root.attributes.height ?? '')];
  return (
    <Svg width={width} height={(width * h) / w} viewBox={`0 0 ${w} ${h}`}>
      {root.children.map(toElement)}
    </Svg>
  );
}

function toElement(node: SvgNode, key: number): ReactNode {
  if (node.tag === 'style' || isHitArea(node)) return null;
  const component = ELEMENTS[node.tag];
  if (component === undefined) throw new RangeError(`a chart draws with <${node.tag}>, which the document cannot show`);
  if (node.tag === 'text') return createElement(component, { key, ...textAttributes(node) }, node.text);
  return createElement(component, { key, ...drawingAttributes(node) }, ...node.children.map(toElement));
}

/** Shapes without fill and stroke that only catch the pointer. */
function isHitArea({ tag, attributes }: SvgNode): boolean {
  if (BACKGROUND_TAGS.has(tag)) return false;
  const { fill, stroke = 'none' } = attributes;
  return fill === 'transparent' || attributes['fill-opacity'] === '0' || (fill === 'none' && stroke === 'none');
}

const camelCase = (name: string): string => name.replace(/-([a-z])/g, (_, letter: string) => letter.toUpperCase());
const asNumber = (value: string): string | number => (/^-?\d*\.?\d+(e-?\d+)?$/i.test(value) ? Number(value) : value);

function drawingAttributes({ attributes }: SvgNode): Attributes {
  const drawn = Object.entries(attributes).filter(([name]) => !NO_DRAWING.has(name) && !name.startsWith('ecmeta'));
  return Object.fromEntries(drawn.map(([name, value]) => [camelCase(name), asNumber(value)]));
}

const stylesOf = (style: string): Map<string, string> =>
  new Map(
    style.split(';').flatMap((declaration) => {
      const [name, value] = declaration.split(/:(.*)/s);
      return name === undefined || value === undefined ? [] : [[name.trim(), value.trim()]];
    }),
  );

/** Text set in the document's fonts; the baseline is moved by hand, since the renderer knows only the alphabetic one. */
function textAttributes(node: SvgNode): Attributes {
  const { attributes } = node;
  const style = stylesOf(attributes.style ?? '');
  const size = Number.parseFloat(style.get('font-size') ?? attributes['font-size'] ?? '12');
  const weight = Number(style.get('font-weight') ?? attributes['font-weight'] ?? '400');
  const baseline = attributes['dominant-baseline'];
  const shift =
    baseline === 'central' || baseline === 'middle'
      ? 0.35 * size
      : baseline === 'hanging' || baseline === 'text-before-edge'
        ? 0.8 * size
        : 0;
  const rest = Object.fromEntries(Object.entries(attributes).filter(([name]) => !TEXT_ATTRIBUTES.has(name)));
  return {
    ...drawingAttributes({ ...node, attributes: rest }),
    x: Number.parseFloat(attributes.x ?? '0'),
    y: Number.parseFloat(attributes.y ?? '0') + shift,
    style: {
      fontSize: size,
      fontFamily: WORK_SANS,
      fontWeight: weight >= 600 ? 600 : 400,
      fontFeatureSettings: ['tnum'],
    },
  };
}
