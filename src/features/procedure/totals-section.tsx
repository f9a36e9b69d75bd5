import type { Procedure } from '../../../shared/contract/procedure';
import { Caution } from '../../ui/caution';
import { EmptyState } from '../../ui/empty-state';
import { Section } from '../../ui/margin-note';
import { TotalsTable } from './totals-table';

/** Totals against their kind, with what must be said beside them. */
export function TotalsSection({ procedure }: { procedure: Procedure }) {
  const validFrom = procedure.planes.map(({ factors }) => factors.validFrom).find((date) => date !== null);
  return (
    <Section title="Totals">
      {procedure.planes.length === 0 ? (
        <EmptyState title="The report tells no totals and no events.">
          The original is kept; the physicist can read the figures off the machine.
        </EmptyState>
      ) : (
        <TotalsTable procedure={procedure} />
      )}
      <div className="grid gap-3 lg:grid-cols-2">
        <Caution of="displayed-tolerance" values={{ ofDate: validFrom ? ` of ${validFrom}` : '' }} />
        <Caution of="reference-point" />
        <Caution of="levels-are-prompts" />
        <Caution of="case-mix" />
      </div>
    </Section>
  );
}
