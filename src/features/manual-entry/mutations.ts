import { useMutation } from '@tanstack/react-query';
import { keptAttachmentSchema, type KeptAttachment } from '../../../shared/contract/attachment';
import {
  enteredSchema,
  type Entered,
  type ManualEntryCorrection,
  type NewManualEntry,
} from '../../../shared/contract/manual-entry';
import { request, upload } from '../../lib/api';

const invalidates = [['procedures'], ['dose-reports'], ['staff-exposure']];

export const useEnterByHand = () =>
  useMutation<Entered, Error, NewManualEntry>({
    mutationFn: (body) => request('/api/manual-entries', { method: 'POST', body, schema: enteredSchema }),
    meta: { invalidates },
  });

export const useCorrectEntry = () =>
  useMutation<Entered, Error, { entryId: string; body: ManualEntryCorrection }>({
    mutationFn: ({ entryId, body }) =>
      request(`/api/manual-entries/${entryId}/corrections`, { method: 'POST', body, schema: enteredSchema }),
    meta: { invalidates },
  });

export const useKeepPicture = () =>
  useMutation<KeptAttachment, Error, File>({
    mutationFn: (file) => {
      const form = new FormData();
      form.append('photo', file, file.name);
      return upload('/api/attachments', form, { schema: keptAttachmentSchema });
    },
  });
