/**
 * What somebody who just started a demo wants to know: where it is, who to sign in as, where mail and payments go.
 * @param {{ url: string, localUrl: string, mailUrl: string, stripeUrl: string }} site
 */
export async function describeSite({ url, localUrl, mailUrl, stripeUrl }) {
  const answer = await fetch(`${localUrl}/api/v1/auth/session`);
  const session = /** @type {{ demoAccounts?: { email: string, password: string, who: string }[] }} */ (
    answer.ok ? await answer.json() : {}
  );
  const { demoAccounts = [] } = session;
  const width = Math.max(0, ...demoAccounts.map(({ email }) => email.length));
  return [
    `  Idlewright   ${url}`,
    `  Mail         ${mailUrl}   every mail it sends, to read`,
    `  Payments     ${stripeUrl}   the stand-in that takes no money`,
    "",
    "  Accounts to try:",
    ...demoAccounts.map(({ email, password, who }) => `    ${email.padEnd(width)}  ${password}   ${who}`),
  ].join("\n");
}
