import { analyzeRun, bend, buildRun, expandRun, pullPoint, straight } from '@fairlead/shared';
import type { CursorPlace } from '@fairlead/shared';
import { fireEvent, render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';
import { describe, expect, it, vi } from 'vitest';
import { Strip } from './strip';

const run = buildRun({
  path: [
    pullPoint({ label: 'LP-2' }),
    straight({ length: 120 }),
    bend(),
    straight({ length: 120 }),
    bend(),
    straight({ length: 60 }),
    pullPoint({ label: 'JB-1' }),
    straight({ length: 60 }),
    ...Array.from({ length: 5 }, () => [bend(), straight({ length: 60 })]).flat(),
    pullPoint({ label: 'AHU-4' }),
  ],
});
const [first, , secondBend] = run.path.filter(({ kind }) => kind !== 'straight');

interface EditorProps {
  selected?: string | null;
  onPoint: (place: CursorPlace | null) => void;
  onEnter: () => void;
}

function Editor({ selected = null, onPoint, onEnter }: EditorProps) {
  const [selectedId, select] = useState(selected);
  return (
    <Strip
      document={run}
      analysis={analyzeRun(run)}
      expanded={expandRun(run)}
      width={1000}
      variant="desk"
      sun={false}
      selectedId={selectedId}
      onSelect={select}
      onPoint={onPoint}
      onEnter={onEnter}
    />
  );
}

function setUp(selected: string | null = null) {
  const onEnter = vi.fn();
  const onPoint = vi.fn<(place: CursorPlace | null) => void>();
  render(<Editor selected={selected} onPoint={onPoint} onEnter={onEnter} />);
  const list = screen.getByRole('listbox');
  const current = () => within(list).queryByRole('option', { selected: true })?.textContent ?? null;
  return { user: userEvent.setup(), list, current, onPoint, onEnter };
}

describe('Strip', () => {
  it('lists every piece in order with station, total and status', () => {
    const { list } = setUp();
    const spoken = within(list)
      .getAllByRole('option')
      .map(({ textContent }) => textContent);
    expect(spoken).toHaveLength(10);
    expect(spoken[0]).toBe('LP-2, at 0″');
    expect(spoken[1]).toMatch(/^1\. Bend 90°, at \d+′ \d+″, 90° of 360° since the pull point$/);
    expect(spoken[8]).toMatch(/450° of 360° since the pull point, over the limit$/);
  });

  it('says what the run says under the pointer, and that it has left', () => {
    const { list, onPoint } = setUp();
    const drawn = list.querySelector('svg')!;
    const moveTo = (clientX: number) => {
      const event = new MouseEvent('pointermove', { clientX, bubbles: true });
      fireEvent(drawn, Object.assign(event, { pointerType: 'mouse' }));
    };
    moveTo(20);
    expect(onPoint).toHaveBeenLastCalledWith(
      expect.objectContaining({ elementId: first?.id, station: 0, isOnPiece: true }),
    );
    moveTo(25);
    expect(onPoint).toHaveBeenCalledTimes(1);
    moveTo(855);
    expect(list.textContent).toMatch(/53′ 0″ · 450° since JB-1/);
    fireEvent(drawn.parentElement!, new MouseEvent('pointerout', { bubbles: true }));
    expect(onPoint).toHaveBeenLastCalledWith(null);
    expect(list.textContent).not.toContain('since JB-1');
  });

  it('is one tab stop', async () => {
    const { user, list } = setUp();
    await user.tab();
    expect(document.activeElement).toBe(list);
    await user.tab();
    expect(document.activeElement).toBe(document.body);
  });

  it('walks the pieces with the arrows and stops at both ends', async () => {
    const { user, list, current } = setUp(first?.id);
    list.focus();
    await user.keyboard('{ArrowLeft}');
    expect(current()).toMatch(/^LP-2/);
    await user.keyboard('{ArrowRight}{ArrowRight}');
    expect(current()).toMatch(/^2\. Bend/);
    await user.keyboard('{End}');
    expect(current()).toMatch(/^AHU-4/);
    await user.keyboard('{ArrowRight}');
    expect(current()).toMatch(/^AHU-4/);
    await user.keyboard('{Home}');
    expect(current()).toMatch(/^LP-2/);
  });

  it('tells a screen reader which piece the keys stand on', async () => {
    const { user, list, current } = setUp();
    expect(list.getAttribute('aria-activedescendant')).toBeNull();
    list.focus();
    await user.keyboard('{ArrowRight}');
    const active = document.getElementById(list.getAttribute('aria-activedescendant') ?? '');
    expect(active?.textContent).toBe(current());
  });

  it('goes to the fields on Enter, once something is selected', async () => {
    const { user, list, onEnter } = setUp();
    list.focus();
    await user.keyboard('{Enter}');
    expect(onEnter).not.toHaveBeenCalled();
    await user.keyboard('{ArrowRight}{Enter}');
    expect(onEnter).toHaveBeenCalledOnce();
  });

  it('stands at the piece a selected leg leads to', () => {
    const leg = run.path[run.path.findIndex(({ id }) => id === secondBend?.id) - 1];
    const { current } = setUp(leg?.id ?? null);
    expect(current()).toMatch(/^2\. Bend/);
  });
});
