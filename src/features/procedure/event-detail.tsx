import type { ReactNode } from 'react';
import type { IrradiationEvent } from '../../../shared/contract/irradiation-event';
import { formatDecimals, formatSignificant } from '../../../shared/units';
import { CloseButton } from '../../ui/close-button';
import { describeAngles, describeFilters, nameEventType } from './event-words';
import { nameReported } from './reported-names';

/** The file's own unit: a bare count has none, and UCUM's braces only annotate. */
const writeUnit = (unit: string | null): string =>
  unit === null || unit === '1' ? '' : ` ${unit.replace(/[{}]/g, '')}`;

const withUnit = (text: string, unit: string | null): string => text + writeUnit(unit);

function writeReported(text: readonly string[], unit: string | null): string {
  if (text.length <= 6) return withUnit(text.join(', '), unit);
  return withUnit(`${text.slice(0, 6).join(', ')} … ${text.length} values`, unit);
}

type EventDetailProps = { event: IrradiationEvent; place: number; onClose: () => void };

/** One irradiation event whole: geometry, filters, and what the file said to the letter. */
export const EventDetail = ({ event, place, onClose }: EventDetailProps) => (
  <section
    aria-label={`Event ${place + 1}`}
    className="flex flex-col gap-2 border-l-3 border-lee bg-surface px-4 py-3 text-sm"
  >
    <div className="flex items-start justify-between gap-4">
      <h3 className="text-base font-semibold">
        Event {place + 1}: {nameEventType(event.type)}
      </h3>
      <CloseButton label="Close this event" onClick={onClose} />
    </div>
    <dl className="grid gap-x-8 gap-y-1 sm:grid-cols-2 xl:grid-cols-3">
      <Pair name="Protocol">{event.protocol ?? 'not reported'}</Pair>
      <Pair name="Angles">{describeAngles(event)}</Pair>
      <Pair name="Filter">{describeFilters(event)}</Pair>
      <Pair name="Source to detector">{withUnit(formatDecimals(event.sourceToDetectorMm, 0), 'mm')}</Pair>
      <Pair name="Source to isocentre">{withUnit(formatDecimals(event.sourceToIsocenterMm, 0), 'mm')}</Pair>
      <Pair name="Field at detector">{withUnit(formatDecimals(event.fieldAreaCm2, 0), 'cm²')}</Pair>
      <Pair name="Beam on">{withUnit(formatSignificant(event.exposureTimeS, 3), 's')}</Pair>
      <Pair name="Event UID">
        <span className="break-all">{event.irradiationEventUid ?? 'not reported'}</span>
      </Pair>
    </dl>
    {Object.keys(event.reported).length > 0 && (
      <>
        <h4 className="condensed font-semibold text-ink-2">As the file says it</h4>
        <dl className="grid gap-x-8 gap-y-1 sm:grid-cols-2 xl:grid-cols-3">
          {Object.entries(event.reported).map(([name, { text, unit }]) => (
            <Pair key={name} name={nameReported(name)}>
              <span className="break-all">{writeReported(text, unit)}</span>
            </Pair>
          ))}
        </dl>
      </>
    )}
  </section>
);

const Pair = ({ name, children }: { name: string; children: ReactNode }) => (
  <div className="flex justify-between gap-3 border-b border-rule py-0.5">
    <dt className="text-ink-2">{name}</dt>
    <dd className="min-w-0 text-right">{children}</dd>
  </div>
);
