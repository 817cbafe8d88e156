import { randomUUID } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import { PASSWORD } from './harness/api';
import { PHONE, useBrowser } from './harness/browser';
import { signInAs } from './harness/sign-in';
import { addPieces, layOutRun, verdictOf } from './harness/workbench';

const { open } = useBrowser();

describe('a new shop', () => {
  it('signs up, makes its first job and run, deletes the job and takes that back', async () => {
    const page = await open();
    await page.goto('/sign-up');
    await page.getByLabel('Your name').fill('Robin Ortega');
    await page.getByLabel('E-mail').fill(`owner-${randomUUID()}@journeys.test`);
    await page.getByLabel('Password', { exact: true }).fill(PASSWORD);
    await page.getByLabel('Shop name').fill('Ortega Electric');
    await page.getByRole('button', { name: 'Start' }).click();

    await page.getByText(/^No jobs yet\./).waitFor();
    await page.getByRole('button', { name: 'New job' }).first().click();
    await page.getByLabel('Job number').fill('26-001');
    await page.getByLabel('Job name').fill('Canal Street annex');
    await page.getByRole('button', { name: 'Create job' }).click();
    await page.getByRole('heading', { name: 'Canal Street annex' }).waitFor();
    await page.getByText(/^No runs yet\./).waitFor();

    await layOutRun(page, { tag: 'F-1', from: 'MDP', to: 'LP-1' });
    await addPieces(page, ['90', '90']);
    expect(await verdictOf(page, 'degrees')).toBe('OK 180 of 360, 180 left');
    await page.getByText(/^Saved \d\d:\d\d$/).waitFor();

    await page.getByRole('link', { name: 'Canal Street annex' }).click();
    await page.locator('tr[data-run="F-1"]').waitFor();
    await page.getByRole('button', { name: 'Delete job' }).click();
    await page.getByText(/^No jobs yet\./).waitFor();
    await page.getByRole('button', { name: 'Undo delete' }).click();
    await page.getByRole('link', { name: 'Canal Street annex' }).click();
    await page.locator('tr[data-run="F-1"]').waitFor();

    await page.goto('/me');
    await page.getByRole('button', { name: 'Sign out' }).click();
    await page.waitForURL(/\/sign-in/);
    await page.goto('/jobs');
    await page.waitForURL(/\/sign-in/);
  });
});

describe('the crew', () => {
  it('sees a job once it is put on it, draws on it, and neither makes nor deletes one', async () => {
    const name = `Depot ${randomUUID().slice(0, 8)}`;
    const foreman = await open();
    await signInAs(foreman, 'foreman');
    await foreman.getByRole('button', { name: 'New job' }).first().click();
    await foreman.getByLabel('Job number').fill(name.slice(-8));
    await foreman.getByLabel('Job name').fill(name);
    await foreman.getByRole('button', { name: 'Create job' }).click();
    await foreman.getByRole('heading', { name }).waitFor();

    const crew = await open({ size: PHONE, touch: true });
    await signInAs(crew, 'crew');
    await crew.getByRole('link', { name: 'Harbor Street clinic' }).waitFor();
    expect(await crew.getByText(name).count()).toBe(0);
    expect(await crew.getByRole('button', { name: 'New job' }).count()).toBe(0);

    await foreman.getByLabel('Put on this job').selectOption({ label: 'Eli Brandt' });
    await foreman.getByRole('button', { name: 'Take Eli Brandt off' }).waitFor();
    await crew.reload();
    await crew.getByRole('link', { name }).click();
    await crew.getByRole('heading', { name }).waitFor();
    expect(await crew.getByRole('button', { name: 'Delete job' }).count()).toBe(0);
    expect(await crew.getByRole('button', { name: 'Edit job' }).count()).toBe(0);
    await crew.getByRole('button', { name: 'Lay out a run' }).click();
    await crew.getByLabel('Tag', { exact: true }).fill('C-1');
    await crew.getByRole('button', { name: 'Lay it out' }).click();
    await crew.getByRole('button', { name: 'Add' }).click();
    await crew.getByRole('button', { name: 'Add 90', exact: true }).click();
    await crew.getByText(/90°/).first().waitFor();
  });
});
