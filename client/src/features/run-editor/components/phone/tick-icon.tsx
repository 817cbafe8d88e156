import type { AddKey } from '../model/new-pieces';

/** Heights of the ticks a key adds to the strip, of 24, by angle. */
const TICKS: Partial<Record<AddKey, readonly number[]>> = {
  'bend-90': [24],
  'kick-45': [15],
  'kick-30': [11],
  'kick-22': [8],
  'offset-22': [8, 8],
  'offset-30': [11, 11],
  'offset-45': [15, 15],
  'box-offset': [6, 6],
  'saddle-3': [8, 15, 8],
  'saddle-4': [11, 11, 11, 11],
};
const STEP = 8;
const WIDTH = 40;

/** A key is drawn as the tick it adds. */
export function TickIcon({ addKey }: { addKey: AddKey }) {
  const ticks = TICKS[addKey];
  return (
    <svg width={WIDTH} height={26} viewBox={`0 0 ${WIDTH} 26`} aria-hidden="true">
      {ticks ? (
        <g stroke="var(--petrol)" strokeWidth="4">
          {ticks.map((height, place) => {
            const x = WIDTH / 2 + (place - (ticks.length - 1) / 2) * STEP;
            return <path key={place} d={`M${x} 26V${26 - height}`} />;
          })}
        </g>
      ) : (
        <g fill="none" stroke="var(--ink)" strokeWidth="2">
          {addKey === 'box' && <path d="M11 5H29V23H11ZM20 9.5V18.5M15.5 14H24.5" />}
          {addKey === 'lb' && <path d="M11 5H29V23H11ZM11 14H20V23" />}
          {addKey === 'flex' && <path d="M4 14q4-9 8 0t8 0 8 0 8 0" stroke="var(--petrol)" />}
          {addKey === 'union' && <path d="M3 11H14M3 17H14M26 11H37M26 17H37M14 7H26V21H14Z" />}
          {addKey === 'transition' && <path d="M3 9H20M3 19H20M20 5V23M20 12H37M20 16H37" />}
        </g>
      )}
    </svg>
  );
}
