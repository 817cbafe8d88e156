/** Bends of the drawing, degrees, and where they stand along its 480 units. 90, 90, box offset, 90, offset 30: 350 of 360. */
const BENDS = [
  { at: 70, angle: 90 },
  { at: 150, angle: 90 },
  { at: 215, angle: 10 },
  { at: 224, angle: 10 },
  { at: 310, angle: 90 },
  { at: 390, angle: 30 },
  { at: 402, angle: 30 },
];
const LIMIT = 360;
const END = 460;
const FOOT = 196;
const UNIT = 0.22;

const height = (degrees: number) => FOOT - degrees * UNIT;

/** The run, its bends as ticks, and the degrees climbing below it toward the limit. */
export function RunDrawing() {
  let degrees = 0;
  let stairs = `M16 ${FOOT}`;
  for (const { at, angle } of BENDS) {
    degrees += angle;
    stairs += `H${at}V${height(degrees)}`;
  }
  stairs += `H${END}`;

  return (
    <svg viewBox="0 0 480 210" width="100%" aria-hidden="true">
      <path d={`${stairs}V${FOOT}Z`} fill="var(--fill-ok)" />
      <path d={`M16 ${FOOT}H${END}`} stroke="var(--edge)" strokeWidth="1" />
      <path
        d={`M16 ${height(LIMIT)}H${END}`}
        stroke="var(--ink)"
        strokeWidth="1.5"
        strokeDasharray="7 5"
      />
      <path d={`${stairs}V${FOOT}`} fill="none" stroke="var(--ink)" strokeWidth="2" />
      <path d={`M16 56H${END}M16 66H${END}`} stroke="var(--ink)" strokeWidth="2" />
      {BENDS.map(({ at, angle }) => (
        <path
          key={at}
          d={`M${at} ${66 - 12 - angle * 0.32}V72`}
          stroke="var(--petrol)"
          strokeWidth="4"
        />
      ))}
      {[16, END].map((at) => (
        <g key={at} stroke="var(--ink)" strokeWidth="2">
          <rect x={at - 11} y="50" width="22" height="22" fill="var(--surface)" />
          <path d={`M${at - 5} 61H${at + 5}M${at} 56V66`} />
        </g>
      ))}
    </svg>
  );
}
