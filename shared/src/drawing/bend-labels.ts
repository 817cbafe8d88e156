import { textWidth } from './text-width';

/** What a piece wants written over its ticks. */
export interface BendLabelWish {
  /** Middle of its ticks, px. */
  x: number;
  text: string;
  /** How many bends it stands for. */
  bends: number;
  section: number;
  priority: 'selected' | 'crosses-limit' | 'rest';
}

export interface BendLabel {
  /** Middle of the text, px. */
  x: number;
  /** What it points at, px. */
  anchorX: number;
  text: string;
  /** 0 stands over the ticks, 1 above that with a leader. */
  row: 0 | 1;
}

interface Group extends BendLabelWish {
  left: number;
  right: number;
}

interface Placed extends BendLabel {
  left: number;
  right: number;
  /** Where its leader passes the lower row. */
  leader: number | null;
}

export interface LabelBox {
  rows: 1 | 2;
  size: number;
  /** Room between two labels of a row, px. */
  gap: number;
  /** Where the rows begin and end, px. */
  left: number;
  right: number;
  countText: (bends: number) => string;
}

/** Half the room kept clear beside a leader, px. */
const LEADER = 3;
const RANK = { selected: 0, 'crosses-limit': 1, rest: 2 } as const;

/**
 * Places the labels over the bends. What does not fit in the rows joins its neighbour of the same section as a count
 * ("4 bends"), never across a pull point; what then still does not fit is left out. The selected piece is placed first,
 * then the one that crosses the limit.
 */
export function placeBendLabels(wishes: readonly BendLabelWish[], box: LabelBox): BendLabel[] {
  let groups: Group[] = wishes.map((wish) => ({ ...wish, left: wish.x, right: wish.x }));
  // Each round joins at least one pair, so there are at most as many rounds as labels.
  for (;;) {
    const { placed, failed } = placeAll(groups, box);
    const joined = joinFailed(groups, failed, box);
    if (joined.length === groups.length) {
      return placed.map(({ x, anchorX, text, row }) => ({ x, anchorX, text, row }));
    }
    groups = joined;
  }
}

function placeAll(
  groups: readonly Group[],
  box: LabelBox,
): { placed: Placed[]; failed: Set<number> } {
  const order = groups
    .map((group, index) => ({ group, index }))
    .sort((a, b) => RANK[a.group.priority] - RANK[b.group.priority] || a.group.x - b.group.x);
  const placed: Placed[] = [];
  const failed = new Set<number>();
  for (const { group, index } of order) {
    const spot = spotsOf(group, box).find((each) =>
      placed.every((other) => areApart(each, other, box.gap)),
    );
    if (spot) placed.push(spot);
    else failed.add(index);
  }
  return { placed, failed };
}

/** Where a label may stand, best first: over the middle of its bends, the upper row next, then towards their ends. */
function spotsOf({ text, x, left, right }: Group, box: LabelBox): Placed[] {
  const width = textWidth(text, box.size, 600);
  if (width > box.right - box.left) return [];
  const centres = left === right ? [x] : [x, (x + left) / 2, (x + right) / 2, left, right];
  const rows = box.rows === 2 ? ([0, 1] as const) : ([0] as const);
  return centres.flatMap((centre) =>
    rows.map((row): Placed => {
      const middle = Math.min(Math.max(centre, box.left + width / 2), box.right - width / 2);
      const half = width / 2;
      const leader = row === 1 ? centre : null;
      return {
        x: middle,
        anchorX: centre,
        text,
        left: middle - half,
        right: middle + half,
        row,
        leader,
      };
    }),
  );
}

function areApart(a: Placed, b: Placed, gap: number): boolean {
  if (a.row === b.row) return a.right + gap <= b.left || b.right + gap <= a.left;
  const [lower, upper] = a.row === 0 ? [a, b] : [b, a];
  const leader = upper.leader ?? upper.x;
  return leader + LEADER <= lower.left || leader - LEADER >= lower.right;
}

/** Each label without a place joins the nearer neighbour of its section; a priority one keeps to itself. */
function joinFailed(groups: readonly Group[], failed: ReadonlySet<number>, box: LabelBox): Group[] {
  const joinedWith = new Map<number, number>();
  const gone = new Set<number>();
  for (const index of failed) {
    const neighbours = [index - 1, index + 1].filter(
      (other) =>
        mayJoin(groups[index], groups[other]) && !gone.has(other) && !joinedWith.has(other),
    );
    const [nearest] = neighbours.sort(
      (a, b) => apart(groups[index], groups[a]) - apart(groups[index], groups[b]),
    );
    if (nearest === undefined || gone.has(index) || joinedWith.has(index)) continue;
    joinedWith.set(Math.min(index, nearest), Math.max(index, nearest));
    gone.add(Math.max(index, nearest));
  }
  return groups.flatMap((group, index) => {
    const other = groups[joinedWith.get(index) ?? -1];
    if (gone.has(index)) return [];
    return [other ? join(group, other, box) : group];
  });
}

function mayJoin(a: Group | undefined, b: Group | undefined): boolean {
  return a?.section === b?.section && a?.priority === 'rest' && b?.priority === 'rest';
}

function apart(a: Group | undefined, b: Group | undefined): number {
  return a && b ? Math.max(a.left - b.right, b.left - a.right) : Infinity;
}

function join(a: Group, b: Group, box: LabelBox): Group {
  const bends = a.bends + b.bends;
  const left = Math.min(a.left, b.left);
  const right = Math.max(a.right, b.right);
  return { ...a, bends, left, right, x: (left + right) / 2, text: box.countText(bends) };
}
