import type { TraderIdentity } from "#shared/schemas/catalogue";

/** A trader's name, address and ways to reach them, as buyers must be told before they buy. */
export function TraderDetails({ trader }: { trader: TraderIdentity }) {
  const { legalName, address, email, phone, registration } = trader;
  return (
    <address className="mt-2 grid gap-0.5 not-italic">
      <span className="font-semibold">{legalName}</span>
      <span>{address.join(", ")}</span>
      <span className="flex flex-wrap gap-x-6">
        <a href={`mailto:${email}`} className="inline-flex min-h-6 items-center">
          {email}
        </a>
        <a href={`tel:${phone.replace(/[^+\d]/g, "")}`} className="inline-flex min-h-6 items-center">
          {phone}
        </a>
      </span>
      {registration && <span className="text-soft">{registration}</span>}
    </address>
  );
}
