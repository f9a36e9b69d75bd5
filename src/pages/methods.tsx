import { estimateMethod, estimateMethodVersion } from '../../shared/dosimetry/estimate-staff-exposure';
import { MethodsLead } from '../features/exposure/methods-lead';
import { MethodsLimits } from '../features/exposure/methods-limits';
import { MethodsPlaces } from '../features/exposure/methods-places';
import { MethodsScatter } from '../features/exposure/methods-scatter';
import { MethodsQuantities, MethodsScreens } from '../features/exposure/methods-shields';
import { MethodsSpreads } from '../features/exposure/methods-spreads';
import { MethodsSteps } from '../features/exposure/methods-steps';
import { Page } from '../frame/page';
import { Caution } from '../ui/caution';
import { MarginNote } from '../ui/margin-note';

const parts = [
  { id: 'limits', name: 'Limits and known biases', Part: MethodsLimits },
  { id: 'steps', name: 'How a staff estimate is made', Part: MethodsSteps },
  { id: 'scatter', name: 'Scatter per KAP', Part: MethodsScatter },
  { id: 'lead', name: 'Transmission of lead', Part: MethodsLead },
  { id: 'screens', name: 'Screens and glasses', Part: MethodsScreens },
  { id: 'quantities', name: 'Dose quantities', Part: MethodsQuantities },
  { id: 'interval', name: 'The interval', Part: MethodsSpreads },
  { id: 'places', name: 'Places in the room', Part: MethodsPlaces },
];

export function Component() {
  return (
    <Page
      title="Methods"
      lead="Models, constants, sources and limits of every estimated figure, printed from the tables that the calculation itself uses."
      margin={
        <>
          <MarginNote title="On this page">
            <nav aria-label="Parts of this page">
              <ul className="flex flex-col gap-1.5 text-sm">
                {parts.map(({ id, name }) => (
                  <li key={id}>
                    <a href={`#${id}`} className="link-line">
                      {name}
                    </a>
                  </li>
                ))}
              </ul>
            </nav>
          </MarginNote>
          <MarginNote title="Method">
            <p className="text-sm text-ink-2">
              {estimateMethod}, version {estimateMethodVersion}. Name and version are stored with every
              estimate.
            </p>
            <p className="text-sm text-ink-2">
              “From memory” stands where a source could not be opened when the constant was entered: your
              physicist confirms it.
            </p>
            <Caution of="reference-point" />
            <Caution of="levels-are-prompts" />
          </MarginNote>
        </>
      }
    >
      {parts.map(({ id, Part }) => (
        <div key={id} id={id} className="scroll-mt-20">
          <Part />
        </div>
      ))}
    </Page>
  );
}
