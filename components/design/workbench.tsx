'use client';

import dynamic from 'next/dynamic';
import { useEffect, useState } from 'react';
import type { UseFormReturn } from 'react-hook-form';
import type { Derivation, Finding } from '@/geometry';
import { OpenToolContext, ToolLinks } from '@/components/tools/tool-links';
import type { ToolName } from '@/components/tools/places';
import type { DesignFiles, DesignRecord } from '@/lib/schemas/api';
import { Cautions } from './cautions';
import { ChosenContext, useChosenValues } from './chosen-values';
import { DesignBar } from './design-bar';
import { DesignForm } from './design-form';
import { designOf, parameterAt, type Draft } from './draft';
import { EditNotices } from './edit-notices';
import { FilesPanel } from './files-panel';
import { focusField } from './focus-field';
import { PlatesColumn } from './plates-column';
import { SectionTools } from './section-tools';
import { PanelSection } from './panel-section';
import { SidePanel } from './side-panel';
import { useAngleStore } from './use-angle-store';
import { useDerivation } from './use-derivation';
import { useHistory } from './use-history';
import { useSaveAsNew } from './use-save-as-new';
import { useSaveKey } from './use-save-key';
import { useSaving } from './use-saving';
import { useUnsaved } from './use-unsaved';

// Loaded with the first tool.
const ToolHost = dynamic(() => import('@/components/tools/tool-host'), { ssr: false });
const ConflictDialog = dynamic(() => import('./conflict-dialog'), { ssr: false });

/** Form, plates and what is made of them. It renders anew with every result; the form does not. */
export function Workbench({
  form,
  record,
  derivation,
  files,
  userId,
}: {
  /** The same object for the life of the screen; the one from the context is not. */
  form: UseFormReturn<Draft>;
  record: DesignRecord;
  derivation: Derivation;
  files: DesignFiles | null;
  userId: string;
}) {
  const [plates, request] = useDerivation(derivation);
  const [invalid, setInvalid] = useState<string | null>(null);
  const [section, setSection] = useState(0);
  const store = useAngleStore(plates.derived);
  // Of plates that are not of this design nothing is said in its fields.
  const chosen = useChosenValues(plates.current && !invalid ? plates.derived : null, section);

  useEffect(
    () =>
      form.subscribe({
        formState: { values: true },
        callback: ({ values }) => {
          const read = designOf(values);
          setInvalid(read.ok ? null : read.message);
          if (read.ok) request(read.design);
        },
      }),
    [form, request],
  );

  const history = useHistory(form);
  const [tool, openTool] = useState<ToolName | null>(null);
  const [toolsUsed, setToolsUsed] = useState(false);
  if (tool && !toolsUsed) setToolsUsed(true);
  const saving = useSaving(form, record, userId);
  const unsaved = useUnsaved(form, saving, userId);
  const saveAsNew = useSaveAsNew(form, userId, record.id);
  useSaveKey(saving);

  function pick(finding: Finding) {
    const key = finding.parameters[0];
    if (!key) return;
    const shared = parameterAt(key) !== undefined;
    const target = finding.section ?? section;
    if (!shared) setSection(target);
    // The other section's fields are on the screen after the next paint.
    requestAnimationFrame(() => focusField(shared ? key : `sections.${target}.${key}`));
  }

  const shownSection = Math.min(section, (plates.derived?.sections.length ?? 1) - 1);
  const stale =
    plates.derived && !plates.current
      ? 'These are the last plates that could be made. The checks say what to change.'
      : null;

  return (
    <OpenToolContext value={openTool}>
      <main id="main" className="flex flex-col bench:h-[calc(100dvh-3rem-1px)] bench:min-h-150">
        <DesignBar saving={saving} history={history} />
        {toolsUsed && (
          <ToolHost
            tool={tool}
            form={form}
            history={history}
            derived={plates.derived}
            section={section}
            saved={{
              id: record.id,
              version: saving.stored.version,
              changed: saving.dirty,
            }}
            onClose={() => openTool(null)}
          />
        )}
        <EditNotices
          saving={saving}
          unsaved={unsaved}
          userId={userId}
          trouble={saveAsNew.error?.message}
          onSaveAsNew={saveAsNew.mutate}
        />
        <div className="grid min-h-0 grow bench:grid-cols-[19.5rem_minmax(0,1fr)_20.5rem] bench:grid-rows-[minmax(0,1fr)]">
          <div className="min-w-0 bench:order-2 bench:flex bench:min-h-0 bench:flex-col">
            <PlatesColumn
              derived={plates.derived}
              section={shownSection}
              store={store}
              note={invalid ? `Plates as they were. ${invalid}` : stale}
            />
          </div>
          <section
            aria-label="Parameters"
            className="relative flex min-w-0 flex-col gap-4 px-5 pt-4 bench:order-1 bench:overflow-y-auto"
          >
            <SectionTools section={section} onChange={setSection} />
            <ChosenContext value={chosen}>
              <DesignForm section={section} />
            </ChosenContext>
          </section>
          <div className="min-w-0 bench:order-3 bench:flex bench:min-h-0 bench:flex-col">
            <SidePanel plates={plates} section={shownSection} store={store} onPick={pick}>
              <PanelSection title="Files">
                <FilesPanel record={saving.stored} first={files} dirty={saving.dirty} />
                <ToolLinks place="files" />
              </PanelSection>
              <Cautions />
            </SidePanel>
          </div>
        </div>
      </main>
      {saving.conflict && (
        <ConflictDialog
          mine={form.getValues()}
          theirs={saving.conflict}
          onOverwrite={() => saving.save(saving.conflict?.version)}
          onTakeTheirs={() => saving.conflict && saving.adopt(saving.conflict)}
          onSaveAsNew={() => {
            saving.dismissConflict();
            saveAsNew.mutate();
          }}
          onClose={saving.dismissConflict}
        />
      )}
    </OpenToolContext>
  );
}
