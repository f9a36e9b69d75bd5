import type { ImageReference } from '../../shared/contract/report-parts';
import type { ContentItem } from './content-tree';

/** What IMAGE items refer to (Acquired Image 113795, Dose Image 121342). */
export function readImages(items: ContentItem[] | undefined): ImageReference[] {
  return (items ?? []).flatMap(({ image }) => (image === null ? [] : [image]));
}
