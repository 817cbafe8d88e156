// From a keystroke in a length field to the strip drawn anew, in Chromium, on the run of 60 pieces.
import { randomUUID } from 'node:crypto';
import { chromium } from 'playwright-core';
import { report } from './figures.mjs';
import { longRun } from './long-run.mjs';

export async function benchKeystroke(url, demo) {
  const foreman = demo.people.find(({ role }) => role === 'owner');
  const browser = await chromium.launch({
    executablePath: '/usr/bin/chromium',
    args: ['--no-sandbox', '--disable-quic', '--no-first-run', '--disable-background-networking'],
  });
  try {
    const page = await browser.newPage({ baseURL: url, viewport: { width: 1440, height: 900 } });
    await page.goto('/sign-in');
    await page.getByLabel('E-mail').fill(foreman.email);
    await page.getByLabel('Password', { exact: true }).fill(demo.password);
    await page.getByRole('button', { name: 'Sign in' }).click();
    await page.waitForURL((at) => at.pathname.startsWith('/jobs'));
    const made = await page.evaluate(makeRun, {
      document: longRun('B-60'),
      ids: [randomUUID(), randomUUID()],
      keys: [randomUUID(), randomUUID()],
    });
    await page.goto(`/jobs/${made.jobId}/runs/${made.runId}`);
    const times = await measure(page);
    report('a keystroke to a redrawn strip, 60 pieces (wanted: 50 ms at most)', times);
  } finally {
    await browser.close();
  }
}

/** In the page, with its own session: a refresh gives the token that the client keeps to itself. */
async function makeRun({ document, ids, keys }) {
  const headers = { 'content-type': 'application/json' };
  const session = await (
    await fetch('/api/auth/refresh', { method: 'POST', headers, body: '{}' })
  ).json();
  const send = async (path, body, key) => {
    const response = await fetch(path, {
      method: 'POST',
      headers: {
        ...headers,
        authorization: `Bearer ${session.accessToken}`,
        'idempotency-key': key,
      },
      body: JSON.stringify(body),
    });
    if (!response.ok) throw new Error(`${path}: ${response.status}`);
    return response.json();
  };
  const job = await send(
    '/api/jobs',
    { id: ids[0], number: `B-${ids[0].slice(0, 8)}`, name: 'Bench' },
    keys[0],
  );
  const run = await send(`/api/jobs/${job.id}/runs`, { id: ids[1], document }, keys[1]);
  return { jobId: job.id, runId: run.id };
}

const RUNS = 30;

/** Enter in the rise of an offset: from the key event to the frame after the strip's marks have changed. */
async function measure(page) {
  await page.locator('tr[data-piece]', { hasText: 'Offset' }).first().click();
  const field = page.getByLabel('Rise');
  const times = [];
  for (let run = 0; run < RUNS; run += 1) {
    await field.fill(run % 2 === 0 ? '9' : '6');
    const drawn = page.evaluate(untilDrawn);
    await field.press('Enter');
    times.push(await drawn);
  }
  // The first ones compile.
  return times.slice(5);
}

/** In the page. */
function untilDrawn() {
  return new Promise((resolve) => {
    let from = 0;
    addEventListener('keydown', () => (from = performance.now()), { once: true, capture: true });
    const observer = new MutationObserver(() => {
      observer.disconnect();
      requestAnimationFrame(() => resolve(performance.now() - from));
    });
    const strip = document.querySelector('[role="listbox"] svg');
    observer.observe(strip, { subtree: true, childList: true, attributes: true });
  });
}
