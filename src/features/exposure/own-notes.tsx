import { paths } from '../../paths';
import { Caution } from '../../ui/caution';
import { MarginNote } from '../../ui/margin-note';
import { TextLink } from '../../ui/text-link';

/** What the own estimate means, and what it does not. */
export const OwnNotes = ({ garmentsConfirmedOn }: { garmentsConfirmedOn: string | null }) => (
  <>
    <MarginNote title="What this means">
      <p className="text-sm text-ink-2">
        Computed from the dose reports of the procedures whose record names you: each event’s KAP, kVp and
        C-arm angle, where you were said to stand, and what you were said to wear. The scatter model errs on
        the high side beside the patient; a badge worn as it should be often reads less.
      </p>
      <Caution of="estimate-not-record" />
      <Caution of="scatter-interval" />
    </MarginNote>
    <MarginNote title="What it leaves out">
      <p className="text-sm text-ink-2">
        Procedures without a complete record, your hands, work in other hospitals, and scatter from walls and
        the tube housing. If you were not in a room where a record puts you, tell the technologist or the
        physicist: the record is corrected and the estimate made anew.
      </p>
      <Caution of="garment-condition" values={{ date: garmentsConfirmedOn ?? 'on no known date' }} />
    </MarginNote>
    <MarginNote title="Who sees this">
      <Caution of="staff-private" />
      <p className="text-sm">
        <TextLink to={paths.methods}>Methods, constants and limits</TextLink>
      </p>
    </MarginNote>
  </>
);
