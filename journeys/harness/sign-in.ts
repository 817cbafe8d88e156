import type { Page } from 'playwright-core';
import { inject } from 'vitest';
import './provided';

/** Through the form, as a person does. */
export async function signIn(page: Page, email: string, password: string): Promise<void> {
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill(email);
  await page.getByLabel('Password', { exact: true }).fill(password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.waitForURL((url) => url.pathname.startsWith('/jobs'));
}

/** As a person of the demo shop. */
export async function signInAs(page: Page, role: string): Promise<void> {
  const { people, password } = inject('demo');
  const person = people.find((each) => each.role === role);
  if (!person) throw new Error(`no ${role} in the demo`);
  await signIn(page, person.email, password);
}
