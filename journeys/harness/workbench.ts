import type { Page } from 'playwright-core';

export interface NewRun {
  tag: string;
  from: string;
  to: string;
}

/** From a job's page, through the dialog, to the workbench. */
export async function layOutRun(page: Page, { tag, from, to }: NewRun): Promise<void> {
  await page.getByRole('button', { name: 'Lay out a run' }).first().click();
  await page.getByLabel('Tag', { exact: true }).fill(tag);
  await page.getByLabel('Leaves from').fill(from);
  await page.getByLabel('Goes to').fill(to);
  await page.getByRole('button', { name: 'Lay it out' }).click();
  await page.locator('[data-check="degrees"]').waitFor();
}

/** Presses add keys one after the other. */
export async function addPieces(page: Page, keys: string[]): Promise<void> {
  for (const key of keys)
    await page.getByRole('button', { name: `Add ${key}`, exact: true }).click();
}

/** What the verdict row says of one check, "OK 350 of 360, 10 left"; met checks may stand behind "4 more OK". */
export async function verdictOf(page: Page, check: string): Promise<string> {
  const verdict = page.locator(`[data-check="${check}"]`);
  const more = page.getByRole('button', { name: /^\d more OK$/ });
  await page.locator('[data-check="degrees"]').waitFor();
  const isBehind = !(await verdict.isVisible());
  if (isBehind) await more.click();
  await verdict.waitFor();
  const parts = await verdict.locator('span').allTextContents();
  if (isBehind) await page.keyboard.press('Escape');
  return parts
    .map((part) => part.trim())
    .filter(Boolean)
    .join(' ');
}
