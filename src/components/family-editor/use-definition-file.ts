import { readFamilyFile, writeFamilyFile } from '@shared/contracts/family-file.ts';
import { findKind } from '@shared/engine/index.ts';
import { shallowRef } from 'vue';
import { saveFile } from '../../api/exports.ts';
import { draftOf, type FamilyDraft } from './draft.ts';
import type { FamilyForm } from './use-family-form.ts';

/** Above this a file is no definition. */
const MOST_BYTES = 1_000_000;

export interface FileFaults {
  readonly name: string;
  readonly faults: readonly { readonly field: string; readonly message: string }[];
}

/** A definition written to and read from a file. What is read is laid into the form, where undo takes it back. */
export function useDefinitionFile(form: FamilyForm, kindStays: () => boolean) {
  const refused = shallowRef<FileFaults | null>(null);

  function write(): void {
    const { definition } = form.read.value;
    if (!definition) return;
    const { code, title } = form.draft;
    const file = new Blob([writeFamilyFile({ code, title, definition })], { type: 'application/json' });
    saveFile({ name: `${code || 'family'}.json`, file });
  }

  function draftFrom(text: string): FamilyDraft | FileFaults['faults'] {
    const read = readFamilyFile(text);
    if (!read.ok) return read.faults;
    const { definition, code, title } = read.file;
    const kind = findKind(definition.kind);
    if (!kind)
      return [{ field: 'definition.kind', message: `There is no kind of detail "${definition.kind}".` }];
    if (kindStays() && kind.id !== form.draft.kind) {
      const message = `This family is of the kind ${form.kind.value.title}; the file has ${kind.title}.`;
      return [{ field: 'definition.kind', message }];
    }
    const names = kindStays() ? form.draft : { code, title };
    return draftOf(definition, kind, { code: names.code, title: names.title });
  }

  /** Returns whether it was taken; otherwise `refused` says why, and the form is as it was. */
  async function read(file: File): Promise<boolean> {
    const tooLarge = [
      { field: 'file', message: `It has ${file.size} bytes; at most ${MOST_BYTES} are read.` },
    ];
    const draft = file.size > MOST_BYTES ? tooLarge : draftFrom(await file.text());
    if ('parameters' in draft) {
      refused.value = null;
      form.take(draft);
      return true;
    }
    refused.value = { name: file.name, faults: draft };
    return false;
  }

  return { refused, write, read };
}
