export const recordSpeeds = ["16 2/3", "33 1/3", "45", "78"] as const;
export const tapeSpeeds = ["1 7/8", "3 3/4", "7 1/2", "15"] as const;
export type NominalSpeed = (typeof recordSpeeds)[number] | (typeof tapeSpeeds)[number];

/**
 * What a nominal speed is exactly: records in rpm, tapes in mm/s.
 *
 * "78" is 78 rpm, as it is called. Records were cut at the two speeds that a stroboscope lamp can show: `true78`.
 * Source: tape by 1 in = 25.4 mm, as tables of tape speeds print it rounded (4.76, 9.53, 19.05, 38.1 cm/s).
 */
export const nominalSpeeds: Readonly<Record<NominalSpeed, number>> = {
  "16 2/3": 50 / 3,
  "33 1/3": 100 / 3,
  "45": 45,
  "78": 78,
  "1 7/8": 47.625,
  "3 3/4": 95.25,
  "7 1/2": 190.5,
  "15": 381,
};

/**
 * The two true speeds of "78" records in rpm, by the mains under which they were cut: 7200 / 92 and 6000 / 77 bars.
 * Source: 77.92 on the calibration disc AES-S001-064, which cites BS 1928:1955 and IEC 98 ed. 2; rpm = 120 f / bars.
 */
export const true78 = [
  { mainsHz: 60, rpm: 7200 / 92 },
  { mainsHz: 50, rpm: 6000 / 77 },
] as const;
