import { fewestUnnamedPeople } from '../../../shared/contract/staff-exposure';
import { paths } from '../../paths';
import { Caution } from '../../ui/caution';
import { MarginNote } from '../../ui/margin-note';
import { TextLink } from '../../ui/text-link';
import { bandKvp, fewestInBand } from './equal-exposure';

/** How to read the chart, and the cautions that belong beside estimates. */
export const ReadingNotes = ({ isUnnamed }: { isUnnamed: boolean }) => (
  <>
    <MarginNote title="Dashed lines">
      <p className="text-sm text-ink-2">
        Equal exposure at the median rate of the procedures shown: in bands of {bandKvp} kVp with at least{' '}
        {fewestInBand} procedures, the value divided by the band’s median exposure per minute of fluoroscopy.
        They describe these procedures and predict none; acquisitions, place and screens are in them as they
        happened. Where fewer than three bands are known there are none.
      </p>
    </MarginNote>
    <MarginNote title="What these figures are">
      <Caution of="estimate-not-record" />
      <Caution of="scatter-interval" />
      <Caution of="displayed-tolerance" />
      <Caution of="staff-private" />
      {isUnnamed && (
        <p className="text-sm text-ink-2">
          Shown without names, cases and dates; nothing is shown where fewer than {fewestUnnamedPeople} people
          stand behind it.
        </p>
      )}
      <p className="text-sm">
        <TextLink to={paths.methods}>Methods, constants and limits</TextLink>
      </p>
    </MarginNote>
  </>
);
