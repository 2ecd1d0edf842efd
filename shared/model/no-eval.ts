/**
 * Keeps zod from compiling validators with `new Function`: the page's
 * Content-Security-Policy forbids it, and even a caught try is reported. Has to be
 * imported before the first schema is built, since zod looks when it builds one.
 */
import { z } from 'zod';

z.config({ jitless: true });
