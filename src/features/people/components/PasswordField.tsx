import { useState, type ReactNode } from 'react';
import { Checkbox } from '../../../components/ui/Checkbox';
import { TextField, type TextFieldProps } from '../../../components/ui/inputs';

/** A password that can be looked at while typing: gloves and small keys make mistakes, a second field only doubles them. */
export function PasswordField(props: Omit<TextFieldProps, 'type'>): ReactNode {
  const [isShown, setShown] = useState(false);
  return (
    <div>
      <TextField {...props} type={isShown ? 'text' : 'password'} autoCapitalize="none" spellCheck={false} />
      <Checkbox
        label={`Show ${props.label.toLowerCase()}`}
        checked={isShown}
        onChange={(event) => setShown(event.target.checked)}
      />
    </div>
  );
}
