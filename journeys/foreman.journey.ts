import { describe, expect, it } from 'vitest';
import { useBrowser } from './harness/browser';
import { signInAs } from './harness/sign-in';
import { addPieces, layOutRun, verdictOf } from './harness/workbench';

const { open } = useBrowser();

describe('a foreman lays out a run before anyone bends', () => {
  it('draws the 350° run, breaks it, fixes it by the angle choice and finds it again', async () => {
    const page = await open();
    await signInAs(page, 'foreman');
    await page.getByRole('link', { name: 'Mill Road warehouse' }).click();
    const tag = `L2-${Date.now() % 1e7}`;
    await layOutRun(page, { tag, from: 'LP-2', to: 'AHU-4' });

    await addPieces(page, ['90', '90', '90', 'Offset 30', 'Box offset']);
    expect(await verdictOf(page, 'degrees')).toBe('OK 350 of 360, 10 left');
    expect(await verdictOf(page, 'bend-fits-leg')).toBe('OK fits');

    // Break it: the offset at 45.
    await page.locator('tr[data-piece]', { hasText: 'Offset 6″' }).click();
    await page.getByRole('radio', { name: /^45°: section 380°/ }).click();
    expect(await verdictOf(page, 'degrees')).toBe('Over limit 380 of 360, 20 over');
    const finding = page.locator('[data-finding="degrees-over"]');
    expect(await finding.textContent()).toContain('380° since LP-2, 20° over');
    expect(await finding.textContent()).toContain('NEC 2023, 358.24(B)');
    expect(await finding.textContent()).toContain('Any offset as a 90: 450°');

    // Fix it: the angle choice shows what each angle would give.
    await page.getByRole('radio', { name: /^22½°: section 335°/ }).click();
    expect(await verdictOf(page, 'degrees')).toBe('OK 335 of 360, 25 left');
    await page.getByText(/^Saved \d\d:\d\d$/).waitFor();

    await page.reload();
    await page.getByText(tag).first().waitFor();
    expect(await verdictOf(page, 'degrees')).toBe('OK 335 of 360, 25 left');

    // Undo survives the reload and is named.
    await page.getByRole('button', { name: 'Undo offset 4 angle' }).click();
    expect(await verdictOf(page, 'degrees')).toBe('Over limit 380 of 360, 20 over');
    await page.getByRole('button', { name: /^Offset 4 at 22½°/ }).click();
    await page.getByText(/^Saved \d\d:\d\d$/).waitFor();

    await page.getByRole('link', { name: 'Mill Road warehouse' }).click();
    const row = page.locator(`tr[data-run="${tag}"]`);
    await row.waitFor();
    expect(await row.textContent()).toContain('335°');
    expect(await row.textContent()).toContain('No answer');
  });
});
