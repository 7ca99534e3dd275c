import canonicalize from 'canonicalize';

/** Degrees of freedom may be infinite (type B); JSON has no infinity, so they stand as null. */
const MAY_BE_INFINITE: ReadonlySet<string> = new Set(['dof', 'effectiveDof']);

// RFC 8785, 3.2.2.2: half of a surrogate pair alone is an error.
const LONE_SURROGATE = /\p{Surrogate}/u;

function plainText(text: string, path: string): string {
  if (LONE_SURROGATE.test(text)) throw new RangeError(`${path} holds half a character.`);
  return text;
}

function isPlainObject(value: object): value is Record<string, unknown> {
  const prototype: unknown = Object.getPrototypeOf(value);
  return prototype === Object.prototype || prototype === null;
}

/** A copy that holds nothing but JSON; what JSON cannot say is refused with the place it stands. */
function plain(value: unknown, path: string, key: string): unknown {
  if (value === null || typeof value === 'boolean') return value;
  if (typeof value === 'string') return plainText(value, path);
  if (typeof value === 'number') {
    if (value === Infinity && MAY_BE_INFINITE.has(key)) return null;
    if (!Number.isFinite(value))
      throw new RangeError(`${path} is ${value}, which JSON cannot say.`);
    return value;
  }
  if (Array.isArray(value)) {
    return Array.from(value, (item: unknown, index) => plain(item, `${path}[${index}]`, ''));
  }
  if (typeof value === 'object' && isPlainObject(value)) {
    return Object.fromEntries(
      Object.entries(value)
        .filter(([, item]) => item !== undefined)
        .map(([name, item]) => [plainText(name, path), plain(item, `${path}.${name}`, name)]),
    );
  }
  throw new TypeError(`${path} is no plain JSON value.`);
}

/**
 * The canonical text of a record (RFC 8785, JSON Canonicalization Scheme): the same value gives the
 * same text on every machine, so that it can be hashed and signed. Infinite degrees of freedom
 * become null; a property that is undefined is left out.
 * @throws {RangeError} for NaN, another infinity or half a surrogate pair; {TypeError} for a value
 * that is no JSON (function, symbol, bigint, date, undefined in an array). The message says where.
 */
export function canonical(record: unknown): string {
  const text = canonicalize(plain(record, 'The record', ''));
  if (text === undefined) throw new TypeError('The record is no plain JSON value.');
  return text;
}
