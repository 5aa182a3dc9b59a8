import { useState } from 'react';

import type { Unit } from '#shared/units/said.ts';

import { rememberedUnit } from './reader.ts';

/** The unit a place is read in: the one last chosen anywhere, else its own. */
export const useUnit = (own: Unit) => useState<Unit>(() => rememberedUnit() ?? own);
