import type Stripe from "stripe";
import { html, type SafeHtml } from "./html";

/** Minor units as people read them: `EUR 48.20`. */
export function moneyText(amount: number, currency: string): string {
  const format = new Intl.NumberFormat("en", {
    style: "currency",
    currency: currency.toUpperCase(),
    currencyDisplay: "code",
  });
  const digits = format.resolvedOptions().maximumFractionDigits ?? 2;
  return format.format(amount / 10 ** digits);
}

function frame(title: string, content: SafeHtml): string {
  return html`<!doctype html>
<html lang="en">
<head>
<meta charset="utf-8">
<meta name="viewport" content="width=device-width, initial-scale=1">
<meta name="robots" content="noindex">
<title>${title} · Payment stand-in</title>
<link rel="stylesheet" href="/pay.css">
</head>
<body>
<main>
<h1>${title}</h1>
<p class="notice"><strong>Payment stand-in.</strong> No card is asked, no money moves.</p>
${content}
</main>
</body>
</html>
`.text;
}

function linesTable(session: Stripe.Checkout.Session, lines: readonly Stripe.LineItem[]): SafeHtml {
  const rows = lines.map(
    (line) => html`<tr><th scope="row">${line.description ?? ""}</th><td class="sum">${line.quantity ?? 1}</td>
<td class="sum">${moneyText(line.amount_total, line.currency)}</td></tr>
`,
  );
  return html`<table>
<caption>Order reference: <strong>${session.client_reference_id ?? "none given"}</strong></caption>
<thead><tr><th scope="col">Line</th><th scope="col" class="sum">Qty</th><th scope="col" class="sum">Amount</th></tr></thead>
<tbody>
${rows}</tbody>
<tfoot><tr><th scope="row" colspan="2">Total</th><td class="sum">${moneyText(session.amount_total!, session.currency!)}</td></tr></tfoot>
</table>
`;
}

/** The page of an open session: what is paid, and the three ways on. `refused` after a refusal. */
export function openPage(
  session: Stripe.Checkout.Session,
  lines: readonly Stripe.LineItem[],
  refused: boolean,
): string {
  const total = moneyText(session.amount_total!, session.currency!);
  const at = `/pay/${session.id}`;
  const refusal = html`<p class="refused" role="alert"><strong>The card was refused.</strong> Nothing was paid. You can try again.</p>
`;
  const leave = html`<form method="post" action="${at}/leave">
<button aria-describedby="leave-note">Leave without paying</button>
<p id="leave-note">Goes back to the shop. The payment stays open until it expires.</p>
</form>
`;
  return frame(
    "Pay for your order",
    html`${refused ? refusal : ""}<h2>What is paid</h2>
${linesTable(session, lines)}<h2>What should happen</h2>
<form class="pay" method="post" action="${at}/pay">
<button aria-describedby="pay-note">Pay ${total}</button>
<p id="pay-note">The payment succeeds.</p>
</form>
<form method="post" action="${at}/decline">
<button aria-describedby="decline-note">Have the card refused</button>
<p id="decline-note">The payment fails, as if the bank had said no.</p>
</form>
${session.cancel_url === null ? "" : leave}`,
  );
}

/** A page that only tells: paid already, expired, not known. `onward` is where to go from here. */
export function statusPage(title: string, message: string, onward: string | null): string {
  const link = onward === null ? "" : html`<p><a class="button" href="${onward}">Go back to the shop</a></p>`;
  return frame(title, html`<p>${message}</p>\n${link}`);
}
