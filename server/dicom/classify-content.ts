import { procedureOf } from './coded-values';
import type { ConceptName } from './concepts.table-data';
import type { ContentTree } from './content-tree';
import { ReadFailure } from './read-failure';

const BASIC_TEXT_SR = '1.2.840.10008.5.1.4.1.1.88.11';

function failAtOtherRoot({ root, itemCount }: ContentTree, sopClassUid: string | null): never {
  const { concept } = root;
  const title = concept ? `${concept.meaning} (${concept.value}, ${concept.scheme})` : 'no title';
  if (root.name === 'radiopharmaceuticalReport') throw new ReadFailure('radiopharmaceutical-report', title);
  if (concept === null && itemCount === 0) throw new ReadFailure('no-content', 'no content items');
  // Titles of findings reports come from LOINC (CID 7000).
  if (sopClassUid === BASIC_TEXT_SR || concept?.scheme === 'LN') throw new ReadFailure('prose-report', title);
  throw new ReadFailure('other-template', title);
}

/**
 * Lets only projection X-ray dose reports pass (TID 10001): by the root concept, then by Procedure reported, then by
 * the containers that only one kind of report has.
 */
export function classifyContent(
  tree: ContentTree,
  sopClassUid: string | null,
  templateId: string | null,
): void {
  const { root, names, itemCount } = tree;
  const has = (...marks: ConceptName[]) => marks.some((name) => names.has(name));
  if (root.name !== 'doseReport') failAtOtherRoot(tree, sopClassUid);
  if (itemCount === 0) throw new ReadFailure('no-content', 'no content items');
  if (templateId === '10040' || has('enhancedAccumulated', 'enhancedDetails')) {
    throw new ReadFailure('enhanced-report', 'template 10040');
  }
  const procedure = procedureOf(
    root.children.find((item) => item.name === 'procedureReported')?.code ?? null,
  );
  if (procedure === 'mammography' || has('accumulatedGlandular')) {
    throw new ReadFailure('mammography-report', 'procedure reported or accumulated glandular dose');
  }
  if (procedure === 'ct' || has('ctAccumulated', 'ctAcquisition')) {
    throw new ReadFailure('ct-report', 'procedure reported or CT containers');
  }
  if (!has('accumulated', 'event')) throw new ReadFailure('no-content', 'neither totals nor events');
}
