// Made by bin/generate.ts.
import type { ErrorObject } from 'ajv';

interface Validator {
  (value: unknown): boolean;
  errors?: ErrorObject[] | null;
}
export declare const validateRecipe: Validator;
export declare const validateHouse: Validator;
