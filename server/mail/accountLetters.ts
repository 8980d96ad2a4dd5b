import type { MailPayloads } from "../commands/queueMail";
import type { Letter } from "./Letter";

type Named = { displayName: string };

export const verifyEmailLetter = ({ displayName, url }: MailPayloads["verify-email"]): Letter => ({
  subject: "Confirm your e-mail address",
  opening: [
    `Hello ${displayName},`,
    "Confirm that this address is yours, so that order mail reaches you. The link works once, for three days.",
  ],
  action: { label: "Confirm this address", url },
  blocks: [
    { paragraph: "If you did not open an account, do nothing: without the link nothing can be bought with it." },
  ],
  why: "You get this because somebody opened an account at Idlewright with this address.",
});

export const resetPasswordLetter = ({ displayName, url }: MailPayloads["reset-password"]): Letter => ({
  subject: "Set a new password",
  opening: [`Hello ${displayName},`, "With this link you set a new password. It works once, for one hour."],
  action: { label: "Set a new password", url },
  blocks: [{ paragraph: "If you did not ask for it, do nothing: your password stays as it is." }],
  why: "You get this because somebody asked for a new password for this address at Idlewright.",
});

export const passwordChangedLetter = ({ displayName }: Named, publicUrl: string): Letter => ({
  subject: "Your password was changed",
  opening: [
    `Hello ${displayName},`,
    "The password of your account was changed just now, and every other session was signed out.",
  ],
  action: { label: "That was not me: set a new password", url: `${publicUrl}/reset-password` },
  blocks: [],
  why: "You get this because it concerns the safety of your account at Idlewright.",
});

export const addressInUseLetter = ({ displayName, url }: MailPayloads["address-in-use"]): Letter => ({
  subject: "You have an account already",
  opening: [
    `Hello ${displayName},`,
    "Somebody tried to open an account with this address, and there is one: yours. If that was you, sign in, or set a new password.",
  ],
  action: { label: "Set a new password", url },
  blocks: [{ paragraph: "If it was not you, nothing has happened: nobody was told that this account exists." }],
  why: "You get this because somebody gave this address at Idlewright.",
});
