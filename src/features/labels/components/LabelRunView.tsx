import type { ReactNode } from 'react';
import type { LabelRun } from '../../../../shared/schemas/labels';
import { LinkButton } from '../../../components/ui/Button';
import { Notice } from '../../../components/ui/Notice';
import { Panel } from '../../../components/ui/Panel';
import { paths } from '../../../config/paths';
import { formatCount } from '../../../lib/format';
import { labelRunPdfUrl } from '../api/getLabelRun';
import { PaperLink } from './PaperLink';
import { RunTags } from './RunTags';

/** A run of labels on its way to the slings: print, stick, confirm each by scanning. */
export function LabelRunView({ run, mayPrint }: { run: LabelRun; mayPrint: boolean }): ReactNode {
  const waiting = run.tags.filter(({ status }) => status === 'printed').length;
  return (
    <div className="flex flex-col gap-8">
      {run.warnings.map((warning) => (
        <Notice key={warning} tone="warn" title="Before you print">
          {warning}
        </Notice>
      ))}
      <Panel title="1. Print">
        <p className="mb-3 max-w-prose">
          Print at actual size (100 %, never “fit to page”). Look at one label: black must be black, the code
          whole, the text sharp.
        </p>
        <div className="flex flex-wrap gap-3">
          <PaperLink to={labelRunPdfUrl(run.id)}>Open the PDF</PaperLink>
          <PaperLink tone="quiet" to={labelRunPdfUrl(run.id)} download={`labels-${run.id}.pdf`}>
            Download
          </PaperLink>
        </div>
      </Panel>
      <Panel
        title="2. Confirm each on its sling"
        aside={
          waiting > 0 ? `${waiting} of ${formatCount(run.tags.length, 'label')} to confirm` : 'All settled'
        }
      >
        <p className="mb-3 max-w-prose">
          Stick the label on, scan it there and type the last four characters of the sling’s serial (or of its
          number where it has none). A label on the wrong twin is the commonest mix-up; until it is confirmed,
          the sling isn’t used.
        </p>
        {waiting > 0 && (
          <LinkButton className="mb-4" to={paths.scan()}>
            Scan and confirm
          </LinkButton>
        )}
        <RunTags run={run} mayPrint={mayPrint} />
      </Panel>
    </div>
  );
}
