import { useEffect, useId, useState, type ChangeEvent } from 'react';
import { useController, useFormContext } from 'react-hook-form';
import { largestPictureBytes, pictureTypes } from '../../../shared/contract/attachment';
import { Button } from '../../ui/button';
import { FieldError } from '../../ui/field';
import { FieldGroup } from '../../ui/field-group';
import { ProblemNote } from '../../ui/problem-note';
import type { EntryValues } from './entry-values';
import { useKeepPicture } from './mutations';

const tooLarge = `The picture is larger than ${largestPictureBytes / 1_048_576} MB. Take it at a lower resolution.`;
const pickerLook =
  'inline-flex min-h-10 cursor-pointer items-center rounded-edge border border-edge bg-surface px-4 py-1.5 font-semibold ' +
  'hover:border-ink focus-within:outline-2 focus-within:outline-offset-2 focus-within:outline-lee';

type PickerProps = {
  label: string;
  isCamera?: boolean;
  onPick: (event: ChangeEvent<HTMLInputElement>) => void;
};

/** A file picker that looks like a button; with `capture` a phone opens its camera at once. */
const Picker = ({ label, isCamera, onPick }: PickerProps) => (
  <label className={pickerLook + (isCamera ? ' pointer-fine:hidden' : '')}>
    {label}
    <input
      type="file"
      className="sr-only"
      accept={pictureTypes.join(',')}
      capture={isCamera ? 'environment' : undefined}
      onChange={onPick}
    />
  </label>
);

/** A picture of the dose screen. It is sent at once, so that a locked screen does not lose it. */
export function PhotoPart() {
  const { control } = useFormContext<EntryValues>();
  const { field, fieldState } = useController({ control, name: 'photo' });
  const [preview, setPreview] = useState<string | null>(null);
  const [isTooLarge, setTooLarge] = useState(false);
  const keep = useKeepPicture();
  const errorId = useId();
  useEffect(() => () => URL.revokeObjectURL(preview ?? ''), [preview]);

  const pick = (event: ChangeEvent<HTMLInputElement>) => {
    const file = event.target.files?.[0];
    event.target.value = '';
    if (!file) return;
    setTooLarge(file.size > largestPictureBytes);
    if (file.size > largestPictureBytes) return;
    keep.mutate(file, {
      onSuccess: ({ id, fileName }) => {
        field.onChange({ id, fileName });
        setPreview(URL.createObjectURL(file));
      },
    });
  };
  const drop = () => {
    field.onChange(null);
    setPreview(null);
  };
  const error = isTooLarge ? tooLarge : fieldState.error?.message;
  return (
    <FieldGroup
      legend="Picture of the dose screen"
      note="Optional, and the best proof of what was typed. It may show the patient’s name: it is shown only to those who may see the patient. Place and time of taking are removed."
    >
      <div className="flex flex-col items-start gap-3 sm:col-span-2">
        {preview && (
          <img
            src={preview}
            alt="The picture just taken"
            className="max-h-80 max-w-full border border-rule"
          />
        )}
        {field.value && <p className="text-sm wrap-anywhere">Kept: {field.value.fileName}</p>}
        <div className="flex flex-wrap gap-3">
          <Picker label="Take a picture" isCamera onPick={pick} />
          <Picker label={field.value ? 'Choose another picture' : 'Choose a picture'} onPick={pick} />
          {field.value && <Button onClick={drop}>Leave the picture out</Button>}
        </div>
        <p role="status" className="text-sm text-ink-2">
          {keep.isPending && 'Sending the picture …'}
        </p>
        {error && <FieldError id={errorId}>{error}</FieldError>}
        <ProblemNote error={keep.error} fieldNames={{ '/photo': 'Picture' }} />
      </div>
    </FieldGroup>
  );
}
