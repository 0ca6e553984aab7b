import { useState, type ReactNode } from 'react';
import { Link } from 'react-router-dom';
import type { LabelRun } from '../../../../shared/schemas/labels';
import { Button, LinkButton } from '../../../components/ui/Button';
import { DataTable, type Column } from '../../../components/ui/DataTable';
import { TagCode } from '../../../components/ui/TagCode';
import { paths } from '../../../config/paths';
import { formatCount } from '../../../lib/format';

type RunTag = LabelRun['tags'][number];

const STATUS_WORDS: Record<RunTag['status'], string> = {
  printed: 'To confirm',
  live: 'Confirmed',
  void: 'Void',
};

/** The run's labels; those that came out wrong can be ticked and printed again. */
export function RunTags({ run, mayPrint }: { run: LabelRun; mayPrint: boolean }): ReactNode {
  const [spoilt, setSpoilt] = useState<readonly number[]>([]);
  const [isChoosing, setChoosing] = useState(false);
  const toggle = (id: number): void =>
    setSpoilt(spoilt.includes(id) ? spoilt.filter((other) => other !== id) : [...spoilt, id]);

  const columns: Column<RunTag>[] = [
    {
      id: 'number',
      header: 'Sling',
      cell: (tag) =>
        isChoosing && tag.status !== 'void' ? (
          <label className="-my-2.5 flex min-h-target items-center gap-3">
            <input
              type="checkbox"
              className="size-6 accent-petrol"
              checked={spoilt.includes(tag.slingId)}
              onChange={() => toggle(tag.slingId)}
            />
            {tag.number}
          </label>
        ) : (
          <Link
            to={paths.sling(tag.slingId)}
            className="-my-2.5 inline-flex min-h-target items-center text-petrol underline underline-offset-4"
          >
            {tag.number}
          </Link>
        ),
    },
    { id: 'code', header: 'Label', cell: (tag) => <TagCode code={tag.code} /> },
    {
      id: 'status',
      header: 'Status',
      cell: (tag) => (
        <span className={tag.status === 'printed' ? 'font-semibold' : 'text-muted'}>
          {STATUS_WORDS[tag.status]}
        </span>
      ),
    },
  ];

  return (
    <>
      <DataTable caption="Labels of this run" columns={columns} rows={run.tags} rowKey={(tag) => tag.code} />
      {mayPrint && (
        <div className="mt-4 flex flex-wrap gap-3">
          {!isChoosing && (
            <Button tone="quiet" onClick={() => setChoosing(true)}>
              Some came out wrong
            </Button>
          )}
          {isChoosing && spoilt.length > 0 && (
            <LinkButton to={`${paths.labelsFor(spoilt)}&reason=misprint`}>
              Print {formatCount(spoilt.length, 'label')} again
            </LinkButton>
          )}
          {isChoosing && (
            <Button
              tone="plain"
              onClick={() => {
                setChoosing(false);
                setSpoilt([]);
              }}
            >
              Leave it
            </Button>
          )}
        </div>
      )}
      {isChoosing && spoilt.length === 0 && (
        <p className="mt-2 text-muted">
          Tick the labels that came out wrong. They are void as soon as the new ones are made.
        </p>
      )}
    </>
  );
}
