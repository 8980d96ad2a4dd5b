/** What can hurt at the bench, in the order in which it is met. Mains work is for a licensed person under local codes. */
export const cautions = {
  power:
    "Unplug the machine and let it discharge before you open it: mains motors and valve chassis can kill. Mains work is for a licensed person under your local codes.",
  spinning: "Keep fingers, sleeves and hair away from what spins; measure only what stands still.",
  tar: "Rubber gone to tar stains and may irritate: wear gloves, scrape it off cold, and keep it off skin and cloth.",
  solvent: "Solvent vapour burns and makes dizzy: open a window, keep flames and sparks away, close the bottle.",
  dust: "Do not breathe the dust of ground or filed rubber: wear a mask and wipe it up wet.",
} as const;
export type Caution = keyof typeof cautions;
