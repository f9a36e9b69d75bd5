import { useQuery, useSuspenseQuery } from '@tanstack/react-query';
import { useDeferredValue, type ReactNode } from 'react';
import { procedureFilterSchema } from '../../shared/contract/procedure-row';
import { can } from '../../shared/permissions';
import { StripLegend } from '../charts/strip-legend';
import { FindBox } from '../features/ledger/find-box';
import { LedgerEmpty } from '../features/ledger/ledger-empty';
import { LedgerLead } from '../features/ledger/ledger-lead';
import { LedgerSentence } from '../features/ledger/ledger-sentence';
import { LedgerTable } from '../features/ledger/ledger-table';
import { listOperators } from '../features/ledger/ledger-words';
import { ledgerQueries } from '../features/ledger/queries';
import { personQueries } from '../features/people/queries';
import { procedureTypeQueries } from '../features/procedure-types/queries';
import { roomQueries } from '../features/rooms/queries';
import { useUser } from '../features/session/queries';
import { UploadBrief } from '../features/uploads/upload-brief';
import { UploadPanel } from '../features/uploads/upload-panel';
import { uploads } from '../features/uploads/uploads';
import { Page } from '../frame/page';
import { kvpShadeLimits } from '../lib/kvp-shades';
import { useUrlFilter } from '../lib/url-filter';
import { paths } from '../paths';
import { ButtonLink } from '../ui/button';
import { Caution } from '../ui/caution';
import { FileDrop } from '../ui/file-drop';
import { MarginNote } from '../ui/margin-note';
import { TextLink } from '../ui/text-link';

export function Component() {
  const user = useUser();
  const [filter, changeFilter] = useUrlFilter(procedureFilterSchema);
  // The list before stays in sight while the next one comes.
  const shown = useDeferredValue(filter);
  const { data: count } = useSuspenseQuery(ledgerQueries.count(shown));
  const { data: rooms = [] } = useQuery(roomQueries.list());
  const { data: types = [] } = useQuery(procedureTypeQueries.list());
  const { data: people = [] } = useQuery({ ...personQueries.choices(), enabled: can(user, 'person.choose') });
  const canReceive = can(user, 'dose-report.receive');
  const canEnter = can(user, 'procedure.enter-by-hand');
  const ledger = (openPicker: (() => void) | null) => (
    <Page
      title="Procedures"
      heading={
        <LedgerSentence
          filter={filter}
          onChange={changeFilter}
          types={types.map(({ id, name }) => ({ value: id, label: name }))}
          rooms={rooms.map(({ id, code }) => ({ value: id, label: code }))}
          operators={listOperators(people)}
        />
      }
      lead={
        <div className="flex flex-col gap-2">
          <LedgerLead
            count={count}
            onShowIncomplete={
              shown.record === 'incomplete' ? null : () => changeFilter({ record: 'incomplete' })
            }
          />
          {openPicker && <UploadBrief onChoose={openPicker} />}
          {canEnter && (
            <TextLink to={paths.enterByHand} className="target self-start margin:hidden">
              No report? Enter by hand
            </TextLink>
          )}
        </div>
      }
      deeds={
        <FindBox
          key={filter.find ?? ''}
          found={filter.find}
          onFind={(find) => changeFilter({ find })}
          canFindPatients={can(user, 'procedure.read-patient')}
        />
      }
      margin={
        <LedgerMargin upload={openPicker && <UploadPanel onChoose={openPicker} />} canEnter={canEnter} />
      }
    >
      <LedgerTable
        filter={shown}
        onChange={changeFilter}
        total={count.total}
        empty={<LedgerEmpty canReceive={canReceive} isFiltered={Boolean(shown.find)} />}
      />
    </Page>
  );
  return canReceive ? (
    <FileDrop onFiles={uploads.add} invitation="Let go to hand over the dose reports">
      {ledger}
    </FileDrop>
  ) : (
    ledger(null)
  );
}

const LedgerMargin = ({ upload, canEnter }: { upload: ReactNode; canEnter: boolean }) => (
  <>
    {upload}
    {canEnter && (
      <MarginNote title="No dose report?">
        <p className="text-sm text-ink-2">For a machine that writes none, or whose report is lost.</p>
        <ButtonLink to={paths.enterByHand}>Enter by hand</ButtonLink>
      </MarginNote>
    )}
    <MarginNote title="The strip, explained once">
      <StripLegend
        plainName="fluoroscopy"
        patternedName="acquisition"
        shadeTitle="kVp"
        shadeLimits={kvpShadeLimits}
        sidesNote="Plane B hangs below the line. Each strip has its own scale, printed below it; height by square root."
      />
    </MarginNote>
    <MarginNote title="What these figures are">
      <Caution of="displayed-tolerance" />
      <Caution of="levels-are-prompts" />
    </MarginNote>
  </>
);
