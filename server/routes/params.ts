import { z } from 'zod';
import { idParam } from '../../shared/schemas/common';

export const idParams = z.object({ id: idParam });
export const codeParams = z.object({ code: z.string().max(200) });
