import type { ReactNode } from 'react';
import { LinkButton } from '../../../components/ui/Button';

/** A link to a PDF that the API makes; not a page of the app. */
export function PaperLink({
  to,
  tone = 'primary',
  download,
  children,
}: {
  to: string;
  tone?: 'primary' | 'quiet';
  /** Saves under this name in place of opening. */
  download?: string;
  children: ReactNode;
}): ReactNode {
  return (
    <LinkButton
      to={to}
      tone={tone}
      reloadDocument
      className="whitespace-nowrap"
      {...(download ? { download } : { target: '_blank', rel: 'noreferrer' })}
    >
      {children}
    </LinkButton>
  );
}
