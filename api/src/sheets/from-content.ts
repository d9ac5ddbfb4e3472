import { InputError } from '@second-spanner/shared/contracts/input-error';

/** A calculation names its own fields; in a request about a step they lie in `content`. */
export const fromContent = ({ field, message }: InputError): InputError =>
  new InputError(/^content\b/.test(field) ? field : `content.${field}`, message);
