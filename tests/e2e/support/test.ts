import { test as base } from '@playwright/test';
import { linkIn, mailsTo, nextMail } from './mail';
import { signIn } from './signIn';

/** Playwright's `test` with `mail`, which reads the catcher, and `signIn`. */
export const test = base.extend<{
	mail: { to: typeof mailsTo; next: typeof nextMail; linkIn: typeof linkIn };
	signIn: typeof signIn;
}>({
	mail: async ({}, use) => use({ to: mailsTo, next: nextMail, linkIn }),
	signIn: async ({}, use) => use(signIn)
});
export { expect } from '@playwright/test';
