import { tags } from './tags';

/**
 * A number beside its decimal string (PS3.3 C.18.1): Floating Point Value (0040,A161, VR FD), else Rational Numerator
 * Value over Denominator Value (0040,A162 over A163, VR SL and UL). Of several values the first counts.
 */
export class PreciseNumber {
  private floatingPoint: number | null = null;
  private numerator: number | null = null;
  private denominator: number | null = null;

  constructor(private readonly isBigEndian: boolean) {}

  /** Takes an attribute of a Measured Value Sequence item; those of other tags or too short count for nothing. */
  take(bytes: Uint8Array, tag: number, start: number, end: number): void {
    const size = tag === tags.floatingPointValue ? 8 : 4;
    if (end - start < size) return;
    const view = new DataView(bytes.buffer, bytes.byteOffset + start, size);
    const isLittleEndian = !this.isBigEndian;
    if (tag === tags.floatingPointValue) this.floatingPoint = view.getFloat64(0, isLittleEndian);
    else if (tag === tags.rationalNumerator) this.numerator = view.getInt32(0, isLittleEndian);
    else if (tag === tags.rationalDenominator) this.denominator = view.getUint32(0, isLittleEndian);
  }

  /** Null if neither form is complete and finite. */
  get value(): number | null {
    const { floatingPoint, numerator, denominator } = this;
    const fraction = numerator === null || denominator === null ? null : numerator / denominator;
    const value = floatingPoint ?? fraction;
    return value === null || !Number.isFinite(value) ? null : value;
  }
}
