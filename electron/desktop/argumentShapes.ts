import { z } from 'zod';
import type { Host } from '../../renderer/host/host.ts';
import type { HostCall } from '../channels.ts';

/** Above any project, schedule or report; characters. */
const MOST_TEXT = 64 * 1024 * 1024;

const token = z.uuid();
const tokenOrNoPlace = z.union([z.literal(''), token]);
const name = z.string().min(1).max(300);
const text = z.string().max(MOST_TEXT);
const recoveryCopy = z.strictObject({
  name: z.string().max(300),
  token: tokenOrNoPlace.nullable(),
  text,
  savedAt: z.iso.datetime({ offset: true }),
});

/** What each call may be given, exactly: the page is not trusted to keep to the types. */
export const ARGUMENT_SHAPES: { readonly [Call in HostCall]: z.ZodType<Parameters<Host[Call]>> } = {
  start: z.tuple([]),
  open: z.tuple([]),
  openRecent: z.tuple([token]),
  recent: z.tuple([]),
  save: z.tuple([tokenOrNoPlace, text, z.boolean()]),
  saveAs: z.tuple([name, text]),
  autosave: z.tuple([recoveryCopy.nullable()]),
  exportText: z.tuple([name, text, z.string().regex(/^[a-z]+\/[a-z0-9.+-]+(; ?charset=[a-z0-9-]+)?$/i)]),
  print: z.tuple([text]),
  savePdf: z.tuple([name, text]),
  importText: z.tuple([z.array(z.string().regex(/^\.?[a-z0-9]{1,10}$/i)).max(20)]),
  setDocumentState: z.tuple([z.strictObject({ title: z.string().max(300), dirty: z.boolean() })]),
  confirmClose: z.tuple([]),
};
