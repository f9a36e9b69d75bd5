import { procedureOf } from './coded-values';
import type { ConceptName } from './concepts.table-data';
import type { ContentItem } from './content-tree';
import { ReadFailure } from './read-failure';

/** True if a container or item of this concept stands anywhere in the tree. */
function has(root: ContentItem, ...names: ConceptName[]): boolean {
  return root.children.some(
    (item) =>
      (item.name !== null && names.includes(item.name)) || (item.children.length > 0 && has(item, ...names)),
  );
}

const BASIC_TEXT_SR = '1.2.840.10008.5.1.4.1.1.88.11';

function failAtOtherRoot(root: ContentItem, sopClassUid: string | null): never {
  const { concept } = root;
  const title = concept ? `${concept.meaning} (${concept.value}, ${concept.scheme})` : 'no title';
  if (root.name === 'radiopharmaceuticalReport') throw new ReadFailure('radiopharmaceutical-report', title);
  if (concept === null && root.children.length === 0) throw new ReadFailure('no-content', 'no content items');
  // Titles of findings reports come from LOINC (CID 7000).
  if (sopClassUid === BASIC_TEXT_SR || concept?.scheme === 'LN') throw new ReadFailure('prose-report', title);
  throw new ReadFailure('other-template', title);
}

/**
 * Lets only projection X-ray dose reports pass (TID 10001): by the root concept, then by Procedure reported, then by
 * the containers that only one kind of report has.
 */
export function classifyContent(
  root: ContentItem,
  sopClassUid: string | null,
  templateId: string | null,
): void {
  if (root.name !== 'doseReport') failAtOtherRoot(root, sopClassUid);
  if (root.children.length === 0) throw new ReadFailure('no-content', 'no content items');
  if (templateId === '10040' || has(root, 'enhancedAccumulated', 'enhancedDetails')) {
    throw new ReadFailure('enhanced-report', 'template 10040');
  }
  const procedure = procedureOf(
    root.children.find((item) => item.name === 'procedureReported')?.code ?? null,
  );
  if (procedure === 'mammography' || has(root, 'accumulatedGlandular')) {
    throw new ReadFailure('mammography-report', 'procedure reported or accumulated glandular dose');
  }
  if (procedure === 'ct' || has(root, 'ctAccumulated', 'ctAcquisition')) {
    throw new ReadFailure('ct-report', 'procedure reported or CT containers');
  }
  if (!has(root, 'accumulated', 'event')) throw new ReadFailure('no-content', 'neither totals nor events');
}
