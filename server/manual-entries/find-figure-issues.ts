import type { TypedQuantity } from '../../shared/contract/manual-entry';
import { readTypedQuantity } from '../../shared/read-typed-quantity';
import { findSecondEntries, isSameAmount, secondEntryAbove } from '../../shared/second-entry';
import { signOfUnit } from '../../shared/typed-units';

type Issue = { pointer: string; detail: string };

const isSameField = (one: TypedQuantity, other: TypedQuantity) =>
  one.quantity === other.quantity && one.plane === other.plane;

/** A machine has one plane, or A and B; a total of both is no figure of its own. */
function findPlaneIssues(quantities: readonly TypedQuantity[]): Issue[] {
  const hasSingle = quantities.some(({ plane }) => plane === 'single');
  return quantities.flatMap((figure, index) => {
    const pointer = `/quantities/${index}/plane`;
    if (figure.plane === 'all' || (hasSingle && figure.plane !== 'single'))
      return [{ pointer, detail: 'Type the figures of one plane, or those of planes A and B.' }];
    return quantities.findIndex((other) => isSameField(figure, other)) < index
      ? [{ pointer, detail: 'This figure is given twice.' }]
      : [];
  });
}

const findReadingIssues = (figures: readonly TypedQuantity[], list: string): Issue[] =>
  figures.flatMap((figure, index) => {
    const { fault } = readTypedQuantity(figure);
    return fault ? [{ pointer: `/${list}/${index}/${fault.part}`, detail: fault.detail }] : [];
  });

function threshold({ quantity }: TypedQuantity): string {
  const unit = quantity === 'reference-air-kerma' ? 'Gy' : 'Gy.cm2';
  return `${secondEntryAbove[quantity] ?? ''} ${signOfUnit(quantity, unit)}`;
}

const write = ({ quantity, text, unit }: TypedQuantity) => `${text} ${signOfUnit(quantity, unit)}`;

/** A large figure stands twice, and both times alike. */
function findConfirmationIssues(
  quantities: readonly TypedQuantity[],
  confirmation: readonly TypedQuantity[],
): Issue[] {
  return findSecondEntries(quantities).flatMap((figure) => {
    const second = confirmation.findIndex((one) => isSameField(one, figure));
    const again = confirmation[second];
    if (!again)
      return [
        {
          pointer: `/quantities/${quantities.indexOf(figure)}/text`,
          detail: `Above ${threshold(figure)} the figure is typed a second time.`,
        },
      ];
    return isSameAmount(figure, again)
      ? []
      : [
          {
            pointer: `/confirmation/${second}/text`,
            detail: `First ${write(figure)}, then ${write(again)}. Look at the machine again.`,
          },
        ];
  });
}

/** Everything that stands against the typed figures, by pointer; plausibility is not among it: it warns, on the page. */
export function findFigureIssues(
  quantities: readonly TypedQuantity[],
  confirmation: readonly TypedQuantity[],
): Issue[] {
  const faults = [
    ...findReadingIssues(quantities, 'quantities'),
    ...findPlaneIssues(quantities),
    ...findReadingIssues(confirmation, 'confirmation'),
  ];
  return faults.length > 0 ? faults : findConfirmationIssues(quantities, confirmation);
}
