import { useState, type FormEvent } from 'react';
import { Button } from '../../ui/button';
import { TextField } from '../../ui/text-field';

/** Looks for files by a part of their names or of their archive's. */
export function FileSearch({ found, onFind }: { found: string; onFind: (text: string) => void }) {
  const [text, setText] = useState(found);
  const [seen, setSeen] = useState(found);
  // Back and forward change the address: the field follows.
  if (found !== seen) {
    setSeen(found);
    setText(found);
  }
  const submit = (event: FormEvent) => {
    event.preventDefault();
    onFind(text.trim());
  };
  return (
    <form role="search" onSubmit={submit} className="flex items-end gap-2">
      <TextField
        label="File or archive name contains"
        type="search"
        value={text}
        onChange={(event) => setText(event.target.value)}
        className="w-64 max-w-full"
      />
      {found !== '' && found === text ? (
        <Button onClick={() => onFind('')}>Clear</Button>
      ) : (
        <Button type="submit">Find</Button>
      )}
    </form>
  );
}
