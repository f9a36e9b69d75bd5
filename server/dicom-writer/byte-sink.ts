/** Bytes written one after another into one growing buffer; a length may be filled in later. */
export class ByteSink {
  private bytes = Buffer.allocUnsafe(65_536);
  length = 0;

  constructor(private readonly isBigEndian: boolean) {}

  private reserve(count: number): void {
    if (this.length + count <= this.bytes.length) return;
    const larger = Buffer.allocUnsafe(Math.max(2 * this.bytes.length, this.length + count));
    this.bytes.copy(larger, 0, 0, this.length);
    this.bytes = larger;
  }

  addUint16(value: number): void {
    this.reserve(2);
    this.length += 2;
    this.setUint16(this.length - 2, value);
  }

  addUint32(value: number): void {
    this.reserve(4);
    this.length += 4;
    this.setUint32(this.length - 4, value);
  }

  addInt32(value: number): void {
    this.addUint32(value >>> 0);
  }

  addFloat64(value: number): void {
    this.reserve(8);
    if (this.isBigEndian) this.bytes.writeDoubleBE(value, this.length);
    else this.bytes.writeDoubleLE(value, this.length);
    this.length += 8;
  }

  setUint16(at: number, value: number): void {
    if (this.isBigEndian) this.bytes.writeUInt16BE(value, at);
    else this.bytes.writeUInt16LE(value, at);
  }

  setUint32(at: number, value: number): void {
    if (this.isBigEndian) this.bytes.writeUInt32BE(value, at);
    else this.bytes.writeUInt32LE(value, at);
  }

  addByte(value: number): void {
    this.reserve(1);
    this.bytes[this.length++] = value;
  }

  addBytes(values: Uint8Array): void {
    this.reserve(values.length);
    this.bytes.set(values, this.length);
    this.length += values.length;
  }

  /** Adds text of ASCII characters; false, and nothing added, where it has others. */
  addAscii(text: string): boolean {
    this.reserve(text.length);
    // Values are a few letters long: a loop is several times faster than the encoder's call.
    for (let index = 0; index < text.length; index++) {
      const code = text.charCodeAt(index);
      if (code > 0x7f) return false;
      this.bytes[this.length + index] = code;
    }
    this.length += text.length;
    return true;
  }

  take(): Buffer {
    return this.bytes.subarray(0, this.length);
  }
}
