import { cleanup, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { PanelBoundary } from './panel-boundary';
import { renderPart } from './testing/render-editor';
import { threeNineties } from './testing/sample-runs';

afterEach(() => {
  cleanup();
  vi.restoreAllMocks();
});

describe('a panel that breaks', () => {
  it('says so, leaves its neighbours alone and comes back', async () => {
    vi.spyOn(console, 'error').mockImplementation(() => undefined);
    let isBroken = true;
    function Panel() {
      if (isBroken) throw new Error('out of order');
      return <p>sketch</p>;
    }
    renderPart(
      threeNineties(),
      <>
        <PanelBoundary>
          <Panel />
        </PanelBoundary>
        <p>list</p>
      </>,
    );
    expect(screen.getByRole('alert').textContent).toContain('your work is kept');
    expect(screen.getByText('list')).toBeTruthy();
    isBroken = false;
    await userEvent.setup().click(screen.getByRole('button', { name: 'Show it again' }));
    expect(screen.getByText('sketch')).toBeTruthy();
  });
});
