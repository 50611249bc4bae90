/**
 * The number formats of the sheets that we write, by what a cell holds: the one place where a name becomes a format
 * string. "text" is no format of its own (the format "@" would turn a formula into its own letters); it stands to
 * the left.
 */
export const numberFormats = {
  general: "General",
  text: "General",
  /** Text that wraps in its column; its row needs a height. */
  paragraph: "General",
  /** A reading, to the tenth that instruments write. */
  temperature: "0.0",
  /** Worked out: a temperature, a difference of two, an uncertainty. */
  degrees: "0.00",
  /** An uncertainty inside a budget, before it is rounded for the certificate. */
  uncertainty: "0.000",
  mV: "0.000",
  factor: "0.00",
  minutes: "0.0",
  count: "0",
  share: "0%",
  probability: "0.00%",
  date: "yyyy-mm-dd",
  time: "hh:mm",
  clock: "hh:mm:ss",
  "date-time": "yyyy-mm-dd hh:mm:ss",
  /** Of a log that somebody opens: as many decimals as it writes. */
  "1 decimal": "0.0",
  "2 decimals": "0.00",
  "3 decimals": "0.000",
  "4 decimals": "0.0000",
  "5 decimals": "0.00000",
  "6 decimals": "0.000000",
} as const;

export type FormatName = keyof typeof numberFormats;
