/** The certificates of a call: one for all its readings, or one for each column of them. */
import {
  type Certificate,
  type CertificateTerms,
  certificate,
  noAnswer,
  Refusal,
  wrongKind,
} from "../../core";
import type { Line } from "../arguments";
import type { Place } from "../cellwise/spec";

type Block = readonly (readonly number[])[];

/** The values of one sensor each: the block's columns, or its rows where the points lie in a row. */
function bySensor({ values, across }: Line<number>, block: Block): readonly (readonly number[])[] | Refusal {
  const sensors = across
    ? block
    : (block[0] ?? []).map((_, sensor) => block.map((row) => row[sensor] as number));
  const count = sensors[0]?.length ?? 0;
  if (count === values.length) return sensors;
  return wrongKind`points and values differ in number, ${values.length} and ${count}`;
}

export class Certificates {
  private constructor(private readonly sensors: readonly (Certificate | Refusal)[]) {}

  static from(points: Line<number>, values: Block, terms: CertificateTerms): Certificates | Refusal {
    const sensors = bySensor(points, values);
    if (sensors instanceof Refusal) return sensors;
    const certificates = sensors.map((sensor) => certificate(points.values, sensor, terms));
    // A single certificate that is refused spoils the whole call; one of several only its own column.
    const [only] = certificates;
    return certificates.length === 1 && only instanceof Refusal ? only : new Certificates(certificates);
  }

  /** The correction in °C at a reading, by the certificate of its column. */
  correction(t: number, { column }: Place, name?: string): number | Refusal {
    const own = this.sensors.length === 1 ? this.sensors[0] : this.sensors[column];
    if (own === undefined)
      return noAnswer`column ${column + 1} has no certificate: values has ${this.sensors.length} columns`;
    return own instanceof Refusal ? own : own.correction(t, name);
  }
}
