import { useQueryClient } from '@tanstack/react-query';
import type { RegroupingLine } from '../../../shared/contract/regrouping';
import { Dialog } from '../../ui/dialog';
import { showToast } from '../../ui/toast-store';
import { useTakeBack } from './mutations';
import { ReasonForm } from './reason-form';
import { describeLine } from './regroup-words';

type TakeBackDialogProps = {
  line: RegroupingLine;
  procedureId: string;
  isOpen: boolean;
  onClose: () => void;
};

/** The way back of the last merge, split or move. */
export function TakeBackDialog({ line, procedureId, isOpen, onClose }: TakeBackDialogProps) {
  const queryClient = useQueryClient();
  const takeBack = useTakeBack(line.id, ({ caseNumber }) => {
    showToast({ text: `The reports are in ${caseNumber} again.` });
    onClose();
  });
  const { sourceVersion, targetVersion } = line;
  return (
    <Dialog isOpen={isOpen} onClose={onClose} title={`Take back: ${describeLine(line, procedureId)}`}>
      <ReasonForm
        saveText="Take back"
        lacking={null}
        error={takeBack.error}
        isPending={takeBack.isPending}
        onCancel={onClose}
        onSubmit={(reason, onError) =>
          takeBack.mutate(
            { sourceVersion, targetVersion, reason },
            {
              onError: (error) => {
                onError(error);
                void queryClient.invalidateQueries({ queryKey: ['procedures', 'one', procedureId] });
              },
            },
          )
        }
      >
        <p>
          The reports go back to {line.source.name}, and with them what came after them for the same study.
          Exposures and totals of both procedures are then as before.
        </p>
      </ReasonForm>
    </Dialog>
  );
}
