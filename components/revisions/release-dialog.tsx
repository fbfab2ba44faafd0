'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Notice } from '@/components/ui/notice';
import { SeverityShape } from '@/components/ui/severity';
import { TextArea } from '@/components/ui/text-area';
import type { Finding } from '@/geometry';
import type { Revision } from '@/lib/schemas/revision';
import { useMove } from './use-move';

const keyOf = ({ code, section, label }: Finding): string => `${code} ${section} ${label}`;

const labelOf = ({ label, section }: Finding): string =>
  section === null ? label : `${label}, section ${section + 1}`;

/** Releases a revision; a check that fails needs the owner's word. */
export default function ReleaseDialog({
  revision,
  findings,
  mayWaive,
  onClose,
}: {
  revision: Revision;
  findings: readonly Finding[];
  mayWaive: boolean;
  onClose: () => void;
}) {
  const fails = findings.filter(({ severity }) => severity === 'fail');
  const [reasons, setReasons] = useState<Readonly<Record<string, string>>>({});
  const move = useMove(revision, onClose);
  const barred = fails.length > 0 && !mayWaive;
  return (
    <Dialog
      title={`Release revision ${revision.number}`}
      isOpen
      onClose={onClose}
      wide={fails.length > 0}
    >
      <form
        onSubmit={(event) => {
          event.preventDefault();
          move.mutate({
            to: 'released',
            from: revision.state,
            waivers: fails.map((finding) => ({
              code: finding.code,
              section: finding.section,
              label: finding.label,
              reason: reasons[keyOf(finding)] ?? '',
            })),
          });
        }}
        className="flex flex-col gap-4"
      >
        <p>
          Its files become the ones to cut from, with your name in the drawing, and can never be
          changed. A revision released before it is superseded. Everybody in the workshop is
          told.
        </p>
        {fails.length > 0 && (
          <>
            <p className="font-medium">
              {fails.length === 1
                ? 'One of its checks fails.'
                : `${fails.length} of its checks fail.`}{' '}
              {barred
                ? 'Only the owner can release it all the same, with a reason for each.'
                : 'Say for each why it is released all the same; your reasons stand in the drawing, the list of files and the record.'}
            </p>
            <ul className="flex flex-col gap-4">
              {fails.map((finding) => (
                <li key={keyOf(finding)} className="flex flex-col gap-1.5">
                  <p className="flex items-start gap-2">
                    <span className="pt-0.5">
                      <SeverityShape severity="fail" />
                    </span>
                    <span>
                      <strong className="font-semibold">{labelOf(finding)}</strong>
                      {finding.change && `: ${finding.change}`}
                    </span>
                  </p>
                  {!barred && (
                    <TextArea
                      label={`Reason, ${labelOf(finding)}`}
                      rows={2}
                      maxLength={500}
                      value={reasons[keyOf(finding)] ?? ''}
                      onChange={(text) =>
                        setReasons((before) => ({ ...before, [keyOf(finding)]: text }))
                      }
                    />
                  )}
                </li>
              ))}
            </ul>
          </>
        )}
        {move.isError && <Notice look="bad">{move.error.message}</Notice>}
        <div className="flex flex-wrap justify-end gap-2">
          <Button onPress={onClose}>{barred ? 'Close' : 'Cancel'}</Button>
          {!barred && (
            <Button type="submit" look="action" isDisabled={move.isPending}>
              {move.isPending ? 'Releasing' : 'Release it'}
            </Button>
          )}
        </div>
      </form>
    </Dialog>
  );
}
