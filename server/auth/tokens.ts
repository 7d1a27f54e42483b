import { createHash, randomBytes } from 'node:crypto';
import { jwtVerify, SignJWT } from 'jose';
import { z } from 'zod';
import type { Claims } from '../services/context.ts';

export const ACCESS_SECONDS = 600;
export const REFRESH_SECONDS = 30 * 86_400;
const ISSUER = 'sixteenfold';
const AUDIENCE = 'sixteenfold-web';
const TYPE = 'at+jwt';
const ALGORITHM = 'HS256';

/** Signing keys, newest first: the first signs, all of them verify. */
export interface SigningKeys {
  readonly newest: { kid: string; secret: Uint8Array };
  readonly byKid: ReadonlyMap<string, Uint8Array>;
}

const keyFile = z
  .array(
    z.strictObject({
      kid: z.string().min(1),
      secret: z.string(),
      created: z.union([z.string(), z.number()]),
    }),
  )
  .min(1);

/**
 * Reads keys.json: [{kid, secret (base64url), created}].
 * @throws Error when there is no key, or one is shorter than 256 bits (RFC 8725, 3.5).
 */
export function readSigningKeys(json: string): SigningKeys {
  const keys = keyFile.parse(JSON.parse(json)).map((k) => ({
    kid: k.kid,
    created: new Date(k.created).getTime(),
    secret: new Uint8Array(Buffer.from(k.secret, 'base64url')),
  }));
  for (const key of keys) {
    if (key.secret.length < 32) throw new Error(`Signing key ${key.kid} is shorter than 256 bits.`);
  }
  keys.sort((a, b) => b.created - a.created);
  const newest = keys[0];
  if (!newest) throw new Error('There is no signing key.');
  return { newest, byKid: new Map(keys.map((k) => [k.kid, k.secret])) };
}

const payload = z.object({
  sub: z.uuid(),
  club: z.uuid().nullable(),
  role: z.enum(['member', 'captain', 'administrator']),
  epoch: z.int(),
  sid: z.uuid(),
});

/** An access token: ten minutes, one club, one role. `now` in milliseconds. */
export async function signAccessToken(keys: SigningKeys, claims: Claims & { familyId: string }, now: number) {
  const seconds = Math.floor(now / 1000);
  return new SignJWT({ club: claims.clubId, role: claims.role, epoch: claims.epoch, sid: claims.familyId })
    .setProtectedHeader({ alg: ALGORITHM, typ: TYPE, kid: keys.newest.kid })
    .setSubject(claims.accountId)
    .setIssuer(ISSUER)
    .setAudience(AUDIENCE)
    .setIssuedAt(seconds)
    .setExpirationTime(seconds + ACCESS_SECONDS)
    .sign(keys.newest.secret);
}

/** The claims of a genuine, unexpired token; null for anything else. */
export async function readAccessToken(keys: SigningKeys, token: string, now: number): Promise<Claims | null> {
  try {
    const { payload: body } = await jwtVerify(
      token,
      (header) => {
        const secret = header.kid === undefined ? undefined : keys.byKid.get(header.kid);
        if (!secret) throw new Error('unknown kid');
        return secret;
      },
      {
        algorithms: [ALGORITHM],
        typ: TYPE,
        issuer: ISSUER,
        audience: AUDIENCE,
        requiredClaims: ['exp', 'iat', 'sub'],
        currentDate: new Date(now),
      },
    );
    const said = payload.parse(body);
    return {
      accountId: said.sub,
      clubId: said.club,
      role: said.role,
      epoch: said.epoch,
      familyId: said.sid,
    };
  } catch {
    return null;
  }
}

/** An opaque refresh token of 256 random bits, and the hash the tables keep. */
export function newRefreshToken(): { token: string; hash: Buffer } {
  const token = randomBytes(32).toString('base64url');
  return { token, hash: hashRefreshToken(token) };
}

export function hashRefreshToken(token: string): Buffer {
  return createHash('sha256').update(token).digest();
}
