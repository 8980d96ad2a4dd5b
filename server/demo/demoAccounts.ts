/** Accounts of the demo data. They exist where the demo data was put, and demo data is refused in production. */
export const demoPassword = "measure twice cut once";
export const demoAccounts = [
  { email: "restorer@idlewright.example", password: demoPassword, who: "a restorer with orders" },
  { email: "workshop@idlewright.example", password: demoPassword, who: "the owner of a workshop" },
  { email: "administrator@idlewright.example", password: demoPassword, who: "an administrator" },
] as const;
