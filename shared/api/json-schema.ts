import { z } from 'zod';
import type { Garment } from '../engine/drafted.ts';
import { bodiceBlockCard, skirtBlockCard } from './block-style.ts';
import { measureCard } from './card.ts';
import { rulesCard } from './rules.ts';
import { styleCard } from './style.ts';

const styles = { gown: styleCard, 'bodice-block': bodiceBlockCard, 'skirt-block': skirtBlockCard };

const files = { card: measureCard, style: styleCard, rules: rulesCard };

/** The three files the command line reads. */
export type InputFile = keyof typeof files;
export const inputFiles: readonly InputFile[] = ['card', 'style', 'rules'];

/** JSON Schema of one of them, every key with its meaning; the style card is that of the garment. */
export const jsonSchema = (file: InputFile, garment: Garment = 'gown'): object =>
  z.toJSONSchema(file === 'style' ? styles[garment] : files[file], { io: 'input' });
