import type { Code, ImageReference } from '../../shared/contract/report-parts';
import type { ConceptName } from './concepts.table-data';

/** One NUM value: the decimal strings as written and the unit; an empty list if nothing was measured. */
export interface Measurement {
  text: string[];
  unit: Code | null;
  qualifier: Code | null;
  /** The number in binary or as a fraction, where the file gives it beside the decimal string. */
  precise: number | null;
}

/** A content item of the SR tree (PS3.3 C.17.3) with its value, whichever type it is of. */
export interface ContentItem {
  valueType: string;
  concept: Code | null;
  /** The concept among those the reader knows. */
  name: ConceptName | null;
  code: Code | null;
  text: string | null;
  measurement: Measurement | null;
  image: ImageReference | null;
  children: ContentItem[];
}

/** What a file holds beside its irradiation events, which are handed over one by one and not kept. */
export interface ContentTree {
  /** The root container and everything below it but the events. */
  root: ContentItem;
  /** The concepts of all items below the root, those of the events and inside them too. */
  names: ReadonlySet<ConceptName>;
  /** Items below the root, events and what they hold included. */
  itemCount: number;
  contentHash: string;
}
