/** Colours by their role; each output knows its own value for light, dark, sun or paper. */
export type Paint =
  | 'ink'
  | 'ink2'
  | 'edge'
  | 'line'
  | 'surface'
  | 'petrol'
  | 'violet'
  | 'violet-tint'
  | 'fill-ok'
  | 'fill-watch'
  | 'fill-over'
  | 'on-over';

export interface Point {
  x: number;
  y: number;
}

interface Drawn {
  stroke?: Paint;
  strokeWidth?: number;
  fill?: Paint;
  /** Lengths of dash and gap, px. */
  dash?: [number, number];
}

export interface PolylineMark extends Drawn {
  kind: 'polyline';
  points: Point[];
  closed?: boolean;
}

export interface RectMark extends Drawn {
  kind: 'rect';
  x: number;
  y: number;
  width: number;
  height: number;
}

export interface CircleMark extends Drawn {
  kind: 'circle';
  x: number;
  y: number;
  radius: number;
}

export type Anchor = 'start' | 'middle' | 'end';

export interface TextMark {
  kind: 'text';
  x: number;
  /** The baseline. */
  y: number;
  text: string;
  size: number;
  weight: 400 | 600;
  anchor: Anchor;
  fill: Paint;
  /** The row it stands in: texts of one row never overlap. */
  row: string;
}

export type Mark = PolylineMark | RectMark | CircleMark | TextMark;

/** A drawing as data: what the screen, the paper and the tests share. In px, y down, back to front. */
export interface DisplayList {
  width: number;
  height: number;
  marks: Mark[];
}

/** A straight line from one point to another. */
export function line(x1: number, y1: number, x2: number, y2: number, drawn: Drawn): PolylineMark {
  return {
    kind: 'polyline',
    points: [
      { x: x1, y: y1 },
      { x: x2, y: y2 },
    ],
    ...drawn,
  };
}
