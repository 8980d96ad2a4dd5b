import { escapeHtml } from "./escapeHtml";
import { type Block, type Letter, type LetterPart, oneLine } from "./Letter";

/** The light tokens of client/styles/tokens.css. Mail has no style sheet that all readers keep, so they stand here. */
const ground = "#EEF2F0";
const sheet = "#F8FAF9";
const ink = "#16202E";
const soft = "#4F5D6B";
const rule = "#C3CECB";
const measured = "#1846C9";
const font = "'Work Sans','Segoe UI',Helvetica,Arial,sans-serif";

const safe = (text: string) => escapeHtml(oneLine(text));
const paragraph = (text: string, colour = ink) =>
  `<p style="margin:0 0 12px;font-size:16px;line-height:24px;color:${colour}">${safe(text)}</p>`;
const small = (text: string) => `<div style="font-size:14px;line-height:20px;color:${soft}">${safe(text)}</div>`;

function part({ title, sizes, forNeed, notes, amount, picture }: LetterPart): string {
  const drawing = picture
    ? `<td style="width:${picture.width}px;padding:0 16px 16px 0;vertical-align:top"><img src="cid:${escapeHtml(picture.contentId)}" width="${picture.width}" height="${picture.height}" alt="${safe(picture.alt)}" style="display:block;border:1px solid ${rule}"></td>`
    : "";
  const details = [sizes, ...(forNeed ? [`For: ${forNeed}`] : []), ...notes].filter(Boolean).map(small).join("");
  return (
    `<table role="presentation" style="border-collapse:collapse;width:100%"><tr>${drawing}` +
    `<td style="padding:0 0 16px;vertical-align:top"><div style="font-size:16px;line-height:24px;font-weight:600">${safe(title)}</div>` +
    `${details}<div style="font-size:16px;line-height:24px;font-variant-numeric:tabular-nums">${safe(amount)}</div></td></tr></table>`
  );
}

function block(one: Block): string {
  if ("heading" in one) {
    return `<h2 style="margin:24px 0 12px;padding-top:12px;border-top:1px solid ${rule};font-size:19px;line-height:24px;font-weight:700">${safe(one.heading)}</h2>`;
  }
  if ("paragraph" in one) return paragraph(one.paragraph);
  if ("lines" in one) {
    return `<p style="margin:0 0 12px;font-size:16px;line-height:24px">${one.lines.map(safe).join("<br>")}</p>`;
  }
  if ("part" in one) return part(one.part);
  const rows = one.facts.map(
    ([label, value]) =>
      `<tr><th scope="row" style="padding:2px 16px 2px 0;text-align:left;vertical-align:top;font-weight:400;color:${soft}">${safe(label)}</th>` +
      `<td style="padding:2px 0;font-variant-numeric:tabular-nums">${safe(value)}</td></tr>`,
  );
  return `<table style="margin:0 0 12px;border-collapse:collapse;font-size:16px;line-height:24px">${rows.join("")}</table>`;
}

const button = ({ label, url }: NonNullable<Letter["action"]>) =>
  `<p style="margin:0 0 16px"><a href="${escapeHtml(url)}" style="display:inline-block;padding:12px 20px;background:${measured};color:${sheet};font-size:16px;line-height:20px;font-weight:600;text-decoration:none">${safe(label)}</a></p>`;

/** The HTML of a mail. Everything that it is told is escaped here, and nothing is fetched from anywhere. */
export function letterHtml({ subject, opening, action, blocks, why }: Letter, markContentId: string): string {
  return (
    `<!doctype html><html lang="en"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width">` +
    `<title>${safe(subject)}</title></head>` +
    `<body style="margin:0;padding:16px;background:${ground};color:${ink};font-family:${font}">` +
    `<div style="max-width:600px;margin:0 auto;padding:24px;background:${sheet};border:1px solid ${rule}">` +
    `<p style="margin:0 0 16px;font-size:16px;line-height:24px;font-weight:700"><img src="cid:${markContentId}" width="24" height="24" alt="" style="vertical-align:middle;margin-right:8px">Idlewright</p>` +
    `<h1 style="margin:0 0 16px;font-size:23px;line-height:28px;font-weight:700">${safe(subject)}</h1>` +
    `${opening.map((text) => paragraph(text)).join("")}${action ? button(action) : ""}${blocks.map(block).join("")}` +
    `<p style="margin:24px 0 0;padding-top:12px;border-top:1px solid ${rule};font-size:14px;line-height:20px;color:${soft}">${safe(why)}</p>` +
    "</div></body></html>"
  );
}
