import type { CheckRule } from '../../../shared/contract/data-check';
import { DefinitionList, DefinitionRow } from '../../ui/definition-row';
import { MarginNote } from '../../ui/margin-note';
import { describeBounds, ownerNames, severityNames } from './check-words';

/** What holds today beside what the product comes with. */
export function RuleFacts({ rule }: { rule: CheckRule }) {
  const { inForce, product, unit, source } = rule;
  const facts = [
    {
      name: 'Severity',
      today: severityNames[inForce.severity],
      product: severityNames[product.severity],
    },
    { name: 'For the', today: ownerNames[inForce.owner], product: ownerNames[product.owner] },
    { name: 'Passes', today: describeBounds(inForce, unit), product: describeBounds(product, unit) },
  ];
  return (
    <MarginNote title="What holds today">
      <DefinitionList>
        {facts.map(({ name, today, product: own }) => (
          <DefinitionRow key={name} name={name} note={today === own ? null : `as delivered: ${own}`}>
            {today}
          </DefinitionRow>
        ))}
      </DefinitionList>
      <p className="text-sm text-ink-2">Source of the bounds as delivered: {source}.</p>
    </MarginNote>
  );
}
