import { DrawnSign } from './drawn-signs';

/** A pencil and the words: these figures were typed, no report tells them. */
export const EnteredByHand = ({ words = 'entered by hand' }: { words?: string }) => (
  <span className="whitespace-nowrap">
    <span aria-hidden="true" className="mr-0.5">
      <DrawnSign name="entered by hand" />
    </span>
    {words}
  </span>
);
