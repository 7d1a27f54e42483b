import { sql } from 'drizzle-orm';
import type { Database, Transaction } from '#database/client.ts';
import type { PictureSettings } from '#shared/contracts/pictures.ts';

export interface PicturesRow extends Record<string, unknown> {
  palette: PictureSettings['palette'];
  letters: boolean;
  own_shades: PictureSettings['ownShades'];
}

/** How pictures are drawn for a person; as usual for someone without an account any more. */
export async function picturesOf(db: Database | Transaction, accountId: string): Promise<PictureSettings> {
  const { rows } = await db.execute<PicturesRow>(sql`select * from pictures_of(${accountId}::uuid)`);
  return presentPictures(rows[0]);
}

export function presentPictures(row: PicturesRow | undefined): PictureSettings {
  return {
    palette: row?.palette ?? 'standard',
    letters: row?.letters ?? false,
    ownShades: row?.own_shades ?? null,
  };
}
