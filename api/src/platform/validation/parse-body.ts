import 'reflect-metadata';
import { plainToInstance } from 'class-transformer';
import { validateSync, type ValidationError } from 'class-validator';
import type { FieldError } from '@second-spanner/shared/contracts/input-error';
import { badInput } from '../errors/http-problem.js';

/**
 * An unknown body as a DTO. Fields that the DTO does not name are refused, at any depth.
 * Throws a 400 problem with every field that is wrong, its path such as `content.value.unit` or `posts[2]`.
 */
export function parseBody<T extends object>(dto: new () => T, body: unknown): T {
  if (typeof body !== 'object' || body === null || Array.isArray(body)) {
    throw badInput({ field: '', message: 'The request must be a JSON object.' });
  }
  const instance = plainToInstance(dto, body);
  const errors = validateSync(instance, {
    whitelist: true,
    forbidNonWhitelisted: true,
    forbidUnknownValues: true,
    validationError: { target: false, value: false },
  });
  if (errors.length > 0) throw badInput(...errors.flatMap((error) => fieldErrors(error, '')));
  return instance;
}

function fieldErrors(error: ValidationError, parent: string): FieldError[] {
  const field = pathOf(parent, error.property);
  const own = Object.entries(error.constraints ?? {}).map(([rule, message]) => ({
    field,
    message: sentence(rule, message, error.property),
  }));
  const inner = (error.children ?? []).flatMap((child) => fieldErrors(child, field));
  return [...own.slice(0, 1), ...inner];
}

function pathOf(parent: string, property: string): string {
  if (parent === '') return property;
  return /^\d+$/.test(property) ? `${parent}[${property}]` : `${parent}.${property}`;
}

function sentence(rule: string, message: string, property: string): string {
  if (rule === 'whitelistValidation') return 'This field is not known here.';
  if (rule === 'nestedValidation') return 'This must be an object, or a list of objects.';
  const rest = message.startsWith(property) ? `This${message.slice(property.length)}` : message;
  return /[.!?]$/.test(rest) ? rest : `${rest}.`;
}
