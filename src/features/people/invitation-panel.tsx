import { useEffect, useRef, useState } from 'react';
import { Button } from '../../ui/button';
import { Field, controlLook } from '../../ui/field';

type InvitationPanelProps = { name: string; email: string | null; url: string };

/** The one-time link, which is shown this once: nobody can look it up again. */
export function InvitationPanel({ name, email, url }: InvitationPanelProps) {
  const field = useRef<HTMLInputElement>(null);
  const [copied, setCopied] = useState<'no' | 'yes' | 'refused'>('no');
  // It takes the form's place: the focus must not be left behind there.
  useEffect(() => field.current?.focus(), []);
  const copy = async () => {
    field.current?.select();
    try {
      await navigator.clipboard.writeText(url);
      setCopied('yes');
    } catch {
      // No clipboard without HTTPS: the selected text can still be copied by hand.
      setCopied('refused');
    }
  };
  return (
    <section
      aria-label="One-time link"
      className="flex max-w-3xl flex-col gap-3 border border-edge bg-surface px-4 py-4"
    >
      <p>
        Send this link to <strong className="font-semibold break-words">{name}</strong>
        {email && <span className="break-words"> ({email})</span>}. It opens once, within 7 days, and lets its
        holder choose the password. It is shown only now; a new one can be made at any time and ends this one.
      </p>
      <Field label="One-time link">
        {(control) => (
          <input
            {...control}
            ref={field}
            readOnly
            value={url}
            onFocus={(event) => event.target.select()}
            className={controlLook}
          />
        )}
      </Field>
      <div className="flex flex-wrap items-center gap-3">
        <Button variant="primary" onClick={() => void copy()}>
          Copy the link
        </Button>
        <p role="status" className="text-sm text-ink-2">
          {copied === 'yes' && 'Copied.'}
          {copied === 'refused' && 'The browser does not allow it; the link is selected, copy it by hand.'}
        </p>
      </div>
    </section>
  );
}
