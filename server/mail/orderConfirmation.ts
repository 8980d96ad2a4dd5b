import { formatMoney } from "#shared/domain/money";
import type { TraderIdentity } from "#shared/schemas/catalogue";
import { Order } from "../models/Order";
import type { OrderLine } from "../models/OrderLine";
import type { Parcel } from "../models/Parcel";
import { User } from "../models/User";
import { readParcels } from "../orders/readParcels";
import type { Services } from "../Services";
import type { Block, Letter } from "./Letter";
import { addressLines, dayInWords, lineBlocks } from "./orderParts";

type ReadParcel = Awaited<ReturnType<typeof readParcels>>[number];

const seller = ({ legalName, address, email, phone, registration }: TraderIdentity): Block => ({
  lines: [
    "Your contract is with:",
    legalName,
    ...address,
    email,
    phone,
    ...(registration ? [`Register: ${registration}`] : []),
  ],
});

/** What is contained in the price, or what may still be asked for. */
function taxFact({ parcel, workshop }: ReadParcel, shipTo: string, currency: string): [string, string] {
  if (parcel.taxRateBasisPoints > 0) {
    return [`Tax contained (${parcel.taxRateBasisPoints / 100} %)`, formatMoney(parcel.taxMinor, currency)];
  }
  return workshop.country === shipTo
    ? ["Tax", "none contained: the workshop is not registered for it"]
    : ["Tax", "none contained: import tax and duty may be asked for on arrival"];
}

/**
 * Withdrawal as the Consumer Rights Directive (2011/83/EU) has it: 14 days from the last item (Art. 9), money back with
 * standard postage within 14 days (Art. 13), goods back within 14 days (Art. 14), and not for goods made to the
 * buyer's specification (Art. 16(c)). We say it to every buyer.
 */
function withdrawal(number: string, lines: readonly OrderLine[]): Block[] {
  const exempt = lines.filter(({ madeToSize }) => madeToSize);
  const all = exempt.length === lines.length;
  return [
    { heading: "Withdrawing" },
    ...(all
      ? []
      : [
          {
            paragraph:
              "You may withdraw within 14 days of receiving the last part, without giving a reason. Write to the workshop at its address above; its answer and your dated mail are the record.",
          },
          {
            paragraph: `These words are enough: "I withdraw from order ${number}", the parts, your name and the date.`,
          },
          {
            paragraph:
              "Send the parts back within 14 days of writing. The workshop pays back the parts and the standard postage within 14 days; it may wait for the parts or for proof that they were sent.",
          },
        ]),
    ...(exempt.length > 0
      ? [
          {
            paragraph: `Made to your size, so without this right: ${exempt.map(({ title }) => title).join("; ")}. Your rights when a part is not as stated remain.`,
          },
        ]
      : []),
  ];
}

function parcelFacts(read: ReadParcel, shipTo: string, currency: string): Block {
  const { parcel } = read;
  return {
    facts: [
      ["Parts", formatMoney(parcel.partsMinor, currency)],
      ["Postage", formatMoney(parcel.shippingMinor, currency)],
      ["This parcel", formatMoney(parcel.totalMinor, currency)],
      taxFact(read, shipTo, currency),
      ...leaves(parcel),
    ],
  };
}

const leaves = ({ leavesBy }: Parcel): [string, string][] => (leavesBy ? [["Leaves by", dayInWords(leavesBy)]] : []);

/** To the buyer: what was bought, from whom, for how much, when it leaves, and how to withdraw. */
export async function orderConfirmation(orderId: string, { config, logger }: Services): Promise<Letter> {
  const order = await Order.findByPk(orderId, { rejectOnEmpty: true });
  const buyer = await User.findByPk(order.buyerId, { rejectOnEmpty: true });
  const { currency, number, shippingAddress, billingAddress } = order;
  const read = await readParcels([orderId]);
  const parcels: Block[] = [];
  for (const one of read) {
    parcels.push(
      { heading: `Parcel from ${one.workshop.name}, ${one.workshop.town}` },
      ...(await lineBlocks(one.lines, {
        currency,
        logger,
        madeToSize: "Made to your size: no withdrawal without a reason",
      })),
      parcelFacts(one, shippingAddress.country, currency),
      seller(one.parcel.trader),
      ...(one.workshop.returnsTerms ? [{ paragraph: `Its terms for returns: ${one.workshop.returnsTerms}` }] : []),
    );
  }
  const total = formatMoney(order.totalMinor, currency);
  return {
    subject: `Order ${number} is paid`,
    opening: [
      `Thank you, ${buyer.displayName}.`,
      `You paid ${total} for ${read.length === 1 ? "one parcel" : `${read.length} parcels`}. Each workshop has been told.`,
    ],
    action: { label: `See order ${number}`, url: `${config.publicUrl}/orders/${order.id}` },
    blocks: [
      ...parcels,
      { heading: "Altogether" },
      {
        facts: [
          ["Parts", formatMoney(order.partsMinor, currency)],
          ["Postage", formatMoney(order.shippingMinor, currency)],
          ["Tax contained", formatMoney(order.taxMinor, currency)],
          ["Total paid", `${total} (${currency})`],
          ["Paid on", dayInWords(order.paidAt ?? order.createdAt)],
        ],
      },
      { heading: "Sent to" },
      { lines: addressLines(shippingAddress) },
      { heading: "Billed to" },
      { lines: addressLines(billingAddress) },
      ...withdrawal(
        number,
        read.flatMap(({ lines }) => lines),
      ),
    ],
    why: `You get this because you paid order ${number} at Idlewright. Keep it: it is your confirmation.`,
  };
}
