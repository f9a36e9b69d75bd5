import type { ReportFilter } from '../../shared/contract/report-event';
import { filterTypeOf, materialOf } from './coded-values';
import type { ContentItem } from './content-tree';
import { ItemIndex } from './item-index';
import { readQuantity, type Reported } from './read-quantity';
import type { WarningCollector } from './warning-collector';

/** Units that differ from filter to filter stand joined, as far as a sensible file has them. */
function joinUnits(known: string | null, added: string | null): string | null {
  if (known === null || added === null) return known ?? added;
  return known.split(', ').includes(added) || known.length > 60 ? known : `${known}, ${added}`;
}

/** X-Ray Filters (113771, TID 10003B): type, material as element symbol, range of thickness. */
export function parseFilter(item: ContentItem, reported: Reported, warnings: WarningCollector): ReportFilter {
  const index = new ItemIndex(item);
  const typeCode = index.code('filterType');
  const materialCode = index.code('filterMaterial');
  const type = filterTypeOf(typeCode);
  const material = materialOf(materialCode);
  if (typeCode && !type) warnings.add('code-unknown', `filter type ${JSON.stringify(typeCode.meaning)}`);
  if (materialCode && !material)
    warnings.add('code-unknown', `filter material ${JSON.stringify(materialCode.meaning)}`);
  const own: Reported = {};
  const bound = (field: string, name: 'filterThicknessMinimum' | 'filterThicknessMaximum') =>
    readQuantity(index.all(name), field, 'length', own, warnings);
  const filter: ReportFilter = {
    type,
    material,
    minThicknessMm: bound('minThicknessMm', 'filterThicknessMinimum'),
    maxThicknessMm: bound('maxThicknessMm', 'filterThicknessMaximum'),
    typeCode,
    materialCode,
  };
  // Filters repeat: their strings stand in the order of the filters, each field's in one list.
  for (const [field, { text, unit }] of Object.entries(own)) {
    const known = reported[`filters.${field}`];
    if (known) {
      for (const one of text) known.text.push(one);
      known.unit = joinUnits(known.unit, unit);
    } else reported[`filters.${field}`] = { text: [...text], unit };
  }
  return filter;
}
