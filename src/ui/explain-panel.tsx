import { useState, type ReactNode } from 'react';
import { DefinitionList, DefinitionRow } from './definition-row';
import { Dialog } from './dialog';

/** Everything that a computed figure must be able to say about itself. */
export type Explanation = {
  title: ReactNode;
  formula: ReactNode;
  inputs: readonly { name: ReactNode; value: ReactNode; origin?: ReactNode }[];
  source: ReactNode;
  /** How the range is found and what it covers. */
  interval?: ReactNode;
  method?: string;
  methodVersion?: string;
  /** Cautions and gaps. */
  notes?: ReactNode;
};

/** "How calculated": a link that opens formula, inputs, source, interval and version of one figure. */
export function ExplainPanel({
  explanation,
  children = 'How calculated',
}: {
  explanation: Explanation;
  children?: ReactNode;
}) {
  const [isOpen, setIsOpen] = useState(false);
  return (
    <>
      <button type="button" className="link-line target text-left" onClick={() => setIsOpen(true)}>
        {children}
      </button>
      <Dialog isOpen={isOpen} onClose={() => setIsOpen(false)} title={explanation.title}>
        <ExplanationBody explanation={explanation} />
      </Dialog>
    </>
  );
}

/** The same, without the dialog: for a methods page or a margin. */
export const ExplanationBody = ({ explanation }: { explanation: Explanation }) => (
  <div className="flex flex-col gap-4">
    <div className="border-y border-rule bg-paper px-3 py-2.5 font-medium">{explanation.formula}</div>
    <DefinitionList>
      {explanation.inputs.map(({ name, value, origin }, place) => (
        <DefinitionRow key={place} name={name} note={origin}>
          {value}
        </DefinitionRow>
      ))}
    </DefinitionList>
    <dl className="flex flex-col gap-2 text-sm">
      {explanation.interval && <Part name="Interval">{explanation.interval}</Part>}
      <Part name="Source">{explanation.source}</Part>
      {explanation.method && (
        <Part name="Method">
          {explanation.method}
          {explanation.methodVersion && `, version ${explanation.methodVersion}`}
        </Part>
      )}
    </dl>
    {explanation.notes && <div className="flex flex-col gap-2">{explanation.notes}</div>}
  </div>
);

const Part = ({ name, children }: { name: string; children: ReactNode }) => (
  <div className="flex gap-3">
    <dt className="w-16 flex-none text-ink-2">{name}</dt>
    <dd>{children}</dd>
  </div>
);
