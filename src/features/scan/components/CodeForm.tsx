import { useState, type FormEvent, type ReactNode } from 'react';
import { Button } from '../../../components/ui/Button';
import { TextField } from '../../../components/ui/inputs';
import { parseTagCode } from '../../../../shared/domain/tags/tagCode';
import { groupWhileTyping } from '../codeTyping';
import { understand } from '../reading';

const FAULTS = {
  length: 'A code has 10 characters, printed as XXXX-XXX-XXX under the picture.',
  alphabet: 'Only letters and figures stand in a code, and never the letter U.',
  check:
    'One character is wrong: the last one doesn’t fit the others. Compare them one by one with the label.',
} as const;

/** Typing the code: any case, with or without dashes, O for 0 and I or L for 1 are understood. */
export function CodeForm({ onCode }: { onCode: (text: string) => void }): ReactNode {
  const [text, setText] = useState('');
  const [error, setError] = useState<string>();

  const handleSubmit = (event: FormEvent): void => {
    event.preventDefault();
    if (understand(text, 'typed', 0).ok) {
      onCode(text);
      setText('');
      return;
    }
    const parsed = parseTagCode(text);
    setError(parsed.ok ? undefined : FAULTS[parsed.reason]);
  };

  return (
    <form onSubmit={handleSubmit} className="flex flex-col gap-3" noValidate>
      <TextField
        label="Type the code"
        hint="It stands under the label’s picture. Capitals and dashes don’t matter."
        mono
        value={text}
        error={error}
        placeholder="XXXX-XXX-XXX"
        autoCapitalize="characters"
        autoCorrect="off"
        spellCheck={false}
        enterKeyHint="go"
        onChange={({ target }) => {
          // Dashes come only at the end of the text: in the middle they would throw the cursor about
          const isAtEnd = target.selectionStart === target.value.length;
          setText(
            isAtEnd && target.value.length > text.length ? groupWhileTyping(target.value) : target.value,
          );
          setError(undefined);
        }}
      />
      <Button type="submit" tone="quiet">
        Look it up
      </Button>
    </form>
  );
}
