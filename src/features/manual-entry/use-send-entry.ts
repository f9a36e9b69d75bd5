import type { Entered, TypedQuantity } from '../../../shared/contract/manual-entry';
import { toCorrection, toNewEntry } from './entry-input';
import type { EntryValues } from './entry-values';
import { useCorrectEntry, useEnterByHand } from './mutations';

type Answers = { onEntered: (entered: Entered) => void; onRefused: (error: Error) => void };

/** Sends a form's values, whichever way they go. */
export type SendEntry = {
  isBusy: boolean;
  error: Error | null;
  mutate: (values: EntryValues, confirmation: TypedQuantity[], key: string, answers: Answers) => void;
};

const toOptions = ({ onEntered, onRefused }: Answers) => ({ onSuccess: onEntered, onError: onRefused });

/** A new entry, of its own or for a procedure that has no figures. */
export function useSendNew(procedureId: string | null): SendEntry {
  const enter = useEnterByHand();
  return {
    isBusy: enter.isPending,
    error: enter.error,
    mutate: (values, confirmation, key, answers) =>
      enter.mutate(toNewEntry(values, confirmation, { key, procedureId }), toOptions(answers)),
  };
}

export function useSendCorrection(entryId: string, version: number): SendEntry {
  const correct = useCorrectEntry();
  return {
    isBusy: correct.isPending,
    error: correct.error,
    mutate: (values, confirmation, _key, answers) =>
      correct.mutate({ entryId, body: toCorrection(values, confirmation, version) }, toOptions(answers)),
  };
}
