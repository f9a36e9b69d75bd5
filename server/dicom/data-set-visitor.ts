/**
 * Told of the parts of a data set in the order of the file. The data set itself is neither opened nor closed;
 * sequences hold items, and items hold values and sequences. Offsets count bytes of the data set.
 */
export interface DataSetVisitor {
  /** `elementStart` is where the tag of the sequence stands. */
  openSequence(tag: number, elementStart: number): void;
  openItem(): void;
  value(tag: number, start: number, end: number): void;
  closeItem(): void;
  closeSequence(): void;
}
