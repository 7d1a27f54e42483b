import { sql } from 'drizzle-orm';
import type { PictureSettings } from '#shared/contracts/pictures.ts';
import { signedOut } from '../../http/problem.ts';
import { asSignedIn, type Ctx } from '../context.ts';
import { type PicturesRow, presentPictures } from './read-pictures.ts';

/** Sets how pictures are drawn for whoever is signed in, on all their devices. The last save stands. */
export async function changePictures(ctx: Ctx, input: PictureSettings): Promise<PictureSettings> {
  const accountId = ctx.claims?.accountId;
  if (!accountId) throw signedOut();
  const shades = input.ownShades === null ? null : JSON.stringify(input.ownShades);
  return asSignedIn(ctx, async (tx) => {
    const { rows } = await tx.execute<PicturesRow>(
      sql`select * from change_pictures(${accountId}::uuid, ${input.palette}, ${input.letters}, ${shades}::jsonb)`,
    );
    return presentPictures(rows[0]);
  });
}
