import type { OrderParcel } from "#shared/schemas/order";

/** Who sells, by law: name, address, how to reach them, registration. */
export function TraderLines({ trader }: { trader: OrderParcel["trader"] }) {
  return (
    <div className="mt-5">
      <p className="text-small text-soft">Sold and sent by</p>
      <p>
        <strong className="font-semibold">{trader.legalName}</strong>, {trader.address.join(", ")}
      </p>
      <p className="flex flex-wrap gap-x-5">
        <a href={`mailto:${trader.email}`} className="inline-block min-h-6">
          {trader.email}
        </a>
        <a href={`tel:${trader.phone.replace(/[^+\d]/g, "")}`} className="inline-block min-h-6">
          {trader.phone}
        </a>
        {trader.registration && <span className="text-soft">{trader.registration}</span>}
      </p>
    </div>
  );
}
