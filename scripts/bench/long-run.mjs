// A run of sixty pieces: box, nine bends with their legs, offsets and a saddle in each of six sections.
import { createRequire } from 'node:module';

const { buildRun, pullPoint, straight, bend, offset, saddle3, wires } = createRequire(
  import.meta.url,
)('@fairlead/shared');

const TURNS = ['north', 'east', 'south', 'east'];

export function longRun(tag) {
  const path = [pullPoint({ label: 'MDP' })];
  for (let section = 0; section < 6; section += 1) {
    path.push(straight({ length: 240 }), bend({ toward: TURNS[0] }));
    path.push(straight({ length: 180 }), offset({ toward: 'up', angle: 30 }));
    path.push(straight({ length: 150 }), bend({ toward: TURNS[1] }));
    path.push(straight({ length: 200 }), saddle3({ toward: 'up' }));
    path.push(straight({ length: 60 }), pullPoint({ label: `JB-${section + 1}` }));
  }
  return buildRun({
    tag,
    raceway: { type: 'EMT', tradeSize: '1' },
    path,
    conductors: [wires({ count: 6, size: '10' })],
  });
}
