import type { Session } from "#shared/schemas/session";
import { Button } from "../../ui/Button";
import { RuledHeading } from "../../ui/RuledHeading";

type Account = NonNullable<Session["demoAccounts"]>[number];

/** Accounts to try, where this is a demonstration. */
export function DemoAccounts({
  accounts,
  onChoose,
}: {
  accounts: readonly Account[];
  onChoose: (account: Account) => void;
}) {
  return (
    <section className="grid max-w-2xl gap-3">
      <RuledHeading>Accounts to try</RuledHeading>
      <p className="text-soft">This is a demonstration: everybody here is invented, and no money moves.</p>
      <ul className="grid gap-2">
        {accounts.map((account) => (
          <li
            key={account.email}
            className="flex flex-wrap items-center justify-between gap-x-4 gap-y-2 border-b border-rule py-2"
          >
            <span>
              <span className="font-semibold">{account.email}</span>
              <br />
              <span className="text-soft">
                {account.who}; password “{account.password}”
              </span>
            </span>
            <Button onClick={() => onChoose(account)} aria-label={`Fill in ${account.who}`}>
              Fill in
            </Button>
          </li>
        ))}
      </ul>
    </section>
  );
}
