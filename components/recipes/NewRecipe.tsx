'use client';

import { zodResolver } from '@hookform/resolvers/zod';
import { useMutation } from '@tanstack/react-query';
import { useRouter } from 'next/navigation';
import { Dialog } from 'radix-ui';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { z } from 'zod';
import { type Recipe, recipeNameSchema, recipeTitleSchema } from '@/app/api/v1/_contracts/recipe';
import type { Sample } from '@/compiler';
import { ApiProblem } from '@/components/api/ApiProblem';
import { requestJson } from '@/components/api/request';
import { startText } from './startText';

const formSchema = z.object({ name: recipeNameSchema, title: recipeTitleSchema, sample: z.string() });
type FormValues = z.infer<typeof formSchema>;

export interface NewRecipeProps {
  readonly slug: string;
  readonly samples: readonly Sample[];
}

function refusalWords(error: unknown): string {
  if (!(error instanceof ApiProblem))
    return 'The server cannot be reached. What you wrote is still here; try again.';
  return error.problem.detail;
}

/** Makes a recipe, from a sample or from nothing, and opens it. */
export function NewRecipe({ slug, samples }: NewRecipeProps) {
  const [isOpen, setIsOpen] = useState(false);
  const router = useRouter();
  const form = useForm<FormValues>({
    resolver: zodResolver(formSchema),
    defaultValues: { name: '', title: '', sample: samples[0]?.id ?? '' },
  });
  const { errors } = form.formState;
  const create = useMutation({
    mutationFn: ({ values, key }: { readonly values: FormValues; readonly key: string }) => {
      const { name, title } = values;
      const sample = samples.find(({ id }) => id === values.sample);
      return requestJson<Recipe>(`/shows/${slug}/recipes`, {
        method: 'POST',
        headers: { 'idempotency-key': key },
        body: {
          name,
          title,
          text: startText(name, title, sample?.text),
          message: sample ? `Begin from the sample ${sample.title}` : 'Begin',
        },
      });
    },
    onSuccess: ({ id }) => router.push(`/recipes/${id}`),
  });
  const isTaken = create.error instanceof ApiProblem && create.error.problem.code === 'name-taken';

  const choices = [...samples, { id: '', title: 'Nothing', summary: 'A root control and no more.' }];

  return (
    <Dialog.Root open={isOpen} onOpenChange={setIsOpen}>
      <Dialog.Trigger asChild>
        <button type="button" className="action action-main">
          New recipe
        </button>
      </Dialog.Trigger>
      <Dialog.Portal>
        <Dialog.Overlay className="dialog-veil" />
        <Dialog.Content className="dialog-sheet">
          <Dialog.Title className="dialog-title">New recipe</Dialog.Title>
          <Dialog.Description className="text-ink-soft">
            Begin from a sample: it is a whole rig that already works, and you change it from there.
          </Dialog.Description>
          <form
            className="mt-4 grid gap-4"
            noValidate
            onSubmit={form.handleSubmit((values) => create.mutate({ values, key: crypto.randomUUID() }))}
          >
            <fieldset className="grid gap-2">
              <legend className="mb-1">Begin from</legend>
              {choices.map(({ id, title, summary }) => (
                <label key={id} className="choice-row">
                  <input type="radio" value={id} {...form.register('sample')} />
                  {id === '' ? null : (
                    // biome-ignore lint/performance/noImgElement: a drawing of a few kilobytes, nothing to optimise.
                    <img className="sample-picture" alt="" loading="lazy" src={`/pictures/samples/${id}`} />
                  )}
                  <span>
                    <span className="font-bold">{title}</span>
                    <span className="block text-ink-soft text-sm">{summary}</span>
                  </span>
                </label>
              ))}
            </fieldset>
            <label className="grid gap-1">
              Title
              <input
                className="plain-input"
                aria-invalid={errors.title !== undefined}
                {...form.register('title')}
              />
              {errors.title && (
                <span className="field-error">Say what people call it, in at most 120 characters.</span>
              )}
            </label>
            <div className="grid gap-1">
              <label className="grid gap-1">
                Name
                <input
                  className="plain-input figures"
                  aria-invalid={errors.name !== undefined || isTaken}
                  aria-describedby="name-help name-error"
                  {...form.register('name')}
                />
              </label>
              <p id="name-help" className="text-ink-soft text-sm">
                Begins every name in the scene: lower-case letters, digits and underscores, a letter first.
              </p>
              <p id="name-error" className="field-error">
                {errors.name && 'Write a name such as old_hare.'}
                {isTaken && 'This show has a recipe of that name. Choose another.'}
              </p>
            </div>
            {create.isError && !isTaken && (
              <p role="alert" className="finding finding-error px-3 py-2">
                {refusalWords(create.error)}
              </p>
            )}
            <div className="flex gap-3">
              <button
                type="submit"
                className="action action-main"
                disabled={create.isPending || create.isSuccess}
              >
                {create.isPending || create.isSuccess ? 'Making…' : 'Make recipe'}
              </button>
              <Dialog.Close asChild>
                <button type="button" className="action">
                  Not now
                </button>
              </Dialog.Close>
            </div>
          </form>
        </Dialog.Content>
      </Dialog.Portal>
    </Dialog.Root>
  );
}
