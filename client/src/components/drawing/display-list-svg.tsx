import type { DisplayList, Mark, Paint, Point } from '@fairlead/shared';
import classes from './drawing.module.css';

const colour = (paint: Paint | undefined) => (paint ? `var(--${paint})` : 'none');
/** A tenth of a pixel is finer than any screen shows. */
const round = (value: number) => Math.round(value * 10) / 10;
const path = (points: readonly Point[], closed = false) =>
  `M${points.map(({ x, y }) => `${round(x)} ${round(y)}`).join('L')}${closed ? 'Z' : ''}`;

/** A drawing on the screen. It says nothing to a screen reader: whoever shows it says it in words beside it. */
export function DisplayListSvg({ list, className }: { list: DisplayList; className?: string }) {
  const { width, height, marks } = list;
  return (
    <svg
      className={className ? `${classes.svg} ${className}` : classes.svg}
      width={width}
      height={height}
      viewBox={`0 0 ${width} ${height}`}
      aria-hidden="true"
      focusable="false"
    >
      {marks.map((mark, index) => (
        <DrawnMark key={index} mark={mark} />
      ))}
    </svg>
  );
}

function DrawnMark({ mark }: { mark: Mark }) {
  if (mark.kind === 'text') {
    return (
      <text
        className={classes.text}
        x={round(mark.x)}
        y={round(mark.y)}
        fontSize={mark.size}
        fontWeight={mark.weight}
        textAnchor={mark.anchor}
        fill={colour(mark.fill)}
        data-row={mark.row}
      >
        {mark.text}
      </text>
    );
  }
  const drawn = {
    fill: colour(mark.fill),
    stroke: colour(mark.stroke),
    strokeWidth: mark.strokeWidth,
    strokeDasharray: mark.dash?.map(round).join(' '),
  };
  switch (mark.kind) {
    case 'polyline':
      return <path {...drawn} d={path(mark.points, mark.closed)} />;
    case 'rect':
      return (
        <rect
          {...drawn}
          x={round(mark.x)}
          y={round(mark.y)}
          width={round(mark.width)}
          height={round(mark.height)}
        />
      );
    case 'circle':
      return <circle {...drawn} cx={round(mark.x)} cy={round(mark.y)} r={round(mark.radius)} />;
  }
}
