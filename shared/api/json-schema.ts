import { z } from 'zod';
import { measureCard } from './card.ts';
import { rulesCard } from './rules.ts';
import { styleCard } from './style.ts';

const files = { card: measureCard, style: styleCard, rules: rulesCard };

/** The three files the command line reads. */
export type InputFile = keyof typeof files;
export const inputFiles: readonly InputFile[] = ['card', 'style', 'rules'];

/** JSON Schema of one of them, every key with its meaning. */
export const jsonSchema = (file: InputFile): object => z.toJSONSchema(files[file], { io: 'input' });
