import { invalid } from './api-error.js';

/** Reads one parameter of a form-encoded request, in which every value is a text. */
export type Reader<Value> = (value: unknown, name: string) => Value;

export const text: Reader<string> = (value, name) => {
  if (typeof value === 'string' && value !== '' && value.length <= 5000) return value;
  throw invalid(`Invalid string: ${name}`, { param: name });
};

export function integer(from: number, to = Number.MAX_SAFE_INTEGER): Reader<number> {
  return (value, name) => {
    const number = typeof value === 'string' && /^-?\d{1,15}$/.test(value) ? Number(value) : NaN;
    if (number >= from && number <= to) return number;
    throw invalid(`Invalid integer: ${String(value)}`, { code: 'parameter_invalid_integer', param: name });
  };
}

export function oneOf<Word extends string>(...words: Word[]): Reader<Word> {
  return (value, name) => {
    const word = words.find((candidate) => candidate === value);
    if (word !== undefined) return word;
    throw invalid(`Invalid ${name}: must be one of ${words.join(', ')}`, { param: name });
  };
}

export const flag: Reader<boolean> = (value, name) => oneOf('true', 'false')(value, name) === 'true';

/** A reader for a point in time; an empty text unsets it. */
export const timestampOrNone: Reader<number | null> = (value, name) =>
  value === '' ? null : integer(0)(value, name);

export function list<Value>(reader: Reader<Value>, most = 20): Reader<Value[]> {
  return (value, name) => {
    if (!Array.isArray(value) || value.length > most)
      throw invalid(`Invalid array: ${name}`, { param: name });
    return value.map((item, index) => reader(item, `${name}[${index}]`));
  };
}

export const metadata: Reader<Record<string, string>> = (value, name) => {
  if (!isRecord(value)) throw invalid(`Invalid hash: ${name}`, { param: name });
  return Object.fromEntries(Object.entries(value).map(([key, item]) => [key, text(item, `${name}[${key}]`)]));
};

/** A parameter that must be there. */
export function required<Value>(reader: Reader<Value>): Reader<Value> & { required: true } {
  return Object.assign((value: unknown, name: string) => reader(value, name), { required: true as const });
}

type Shape = Record<string, Reader<unknown>>;
type Optional<Value> = Value | undefined;
export type Params<Known extends Shape> = {
  [Name in keyof Known]: Known[Name] extends { required: true }
    ? ReturnType<Known[Name]>
    : Optional<ReturnType<Known[Name]>>;
};

/** Parameters by their names: any other is refused. */
export function shape<Known extends Shape>(known: Known): Reader<Params<Known>> {
  return (value, name) => {
    if (!isRecord(value)) throw invalid(`Invalid hash: ${name}`, { param: name });
    const path = (key: string) => (name === '' ? key : `${name}[${key}]`);
    for (const key of Object.keys(value)) if (!Object.hasOwn(known, key)) throw unknownParameter(path(key));
    const read = Object.entries(known).map(([key, reader]) => [key, readOne(reader, value[key], path(key))]);
    return Object.fromEntries(read) as Params<Known>;
  };
}

function readOne(reader: Reader<unknown> & { required?: true }, value: unknown, name: string): unknown {
  if (value !== undefined) return reader(value, name);
  if (!reader.required) return undefined;
  throw invalid(`Missing required param: ${name}.`, { code: 'parameter_missing', param: name });
}

function unknownParameter(name: string) {
  return invalid(`Received unknown parameter: ${name}`, { code: 'parameter_unknown', param: name });
}

function isRecord(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}
