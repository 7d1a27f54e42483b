import { z } from 'zod';
import { endpoints } from '#shared/contracts/endpoints.ts';
import { changePicturesInput, pictureSettings } from '#shared/contracts/pictures.ts';
import { sessionView } from '#shared/contracts/session.ts';
import { changePictures } from '../../services/pictures/change-pictures.ts';
import { readSession } from '../../services/session/read-session.ts';
import { defineRow } from '../define-row.ts';

export const nothing = z.strictObject({}) as z.ZodType<Record<string, never>>;

/** What of the session needs no cookie; the rest is in routes.ts beside this. */
export const sessionRows = {
  readSession: defineRow({
    endpoint: endpoints.readSession,
    who: 'signed-in',
    input: nothing,
    output: sessionView,
    service: readSession,
  }),
  changePictures: defineRow({
    endpoint: endpoints.changePictures,
    who: 'signed-in',
    input: changePicturesInput,
    output: pictureSettings,
    service: changePictures,
  }),
};
