import 'server-only';
import { randomBytes } from 'node:crypto';

/** 120 random bits: ids cannot be guessed or counted. */
export const newId = (): string => randomBytes(15).toString('base64url');
