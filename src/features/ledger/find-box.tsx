import { useState, type FormEvent } from 'react';
import { Button } from '../../ui/button';
import { TextField } from '../../ui/text-field';

type FindBoxProps = {
  found: string | undefined;
  onFind: (text: string) => void;
  /** Patients can be searched by those who may see them. */
  canFindPatients: boolean;
};

/** Looks for a case, and for a patient where the reader may see patients. */
export function FindBox({ found, onFind, canFindPatients }: FindBoxProps) {
  const [text, setText] = useState(found ?? '');
  const submit = (event: FormEvent) => {
    event.preventDefault();
    onFind(text.trim());
  };
  const clear = () => {
    setText('');
    onFind('');
  };
  return (
    <form role="search" onSubmit={submit} className="flex items-end gap-2">
      <TextField
        label={canFindPatients ? 'Find a case, patient or accession' : 'Find a case number'}
        type="search"
        value={text}
        onChange={(event) => setText(event.target.value)}
        className="w-64 max-w-full"
      />
      {found && found === text ? <Button onClick={clear}>Clear</Button> : <Button type="submit">Find</Button>}
    </form>
  );
}
