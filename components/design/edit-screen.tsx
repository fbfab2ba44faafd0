'use client';

import type { ComponentProps } from 'react';
import { FormProvider, useForm } from 'react-hook-form';
import { draftOf, type Draft } from './draft';
import { Workbench } from './workbench';

/** The design in a builder's hands. Holds the form and nothing that changes with a keystroke. */
export function EditScreen(props: Omit<ComponentProps<typeof Workbench>, 'form'>) {
  const { name, design } = props.record;
  const form = useForm<Draft>({ defaultValues: draftOf(name, design) });
  return (
    <FormProvider {...form}>
      <Workbench {...props} form={form} />
    </FormProvider>
  );
}
