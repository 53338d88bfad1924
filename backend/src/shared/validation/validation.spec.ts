import 'reflect-metadata';
import { CONDITION_FIELDS } from '@roothertz/common/conditions';
import { DomainError } from '../errors/domain-error.js';
import { ListQueryDto } from '../list/list-query.dto.js';
import { Nested } from './nested.decorator.js';
import { Option, Options } from './option.decorator.js';
import { Quantity } from './quantity.decorator.js';
import { Text } from './text.decorator.js';
import { createValidationPipe } from './validation-pipe.js';

const COLOURS = ['red', 'green'];

class BandDto {
  @Quantity(CONDITION_FIELDS['conditions.band.upper'])
  upper: number;
}

class RequestDto {
  @Nested(() => BandDto)
  band: BandDto;

  @Quantity(CONDITION_FIELDS['filter.channels'], { optional: true, nullable: true, orAuto: true })
  channels?: number | 'auto' | null;

  @Option(COLOURS, { optional: true })
  colour?: string;

  @Options(COLOURS, { optional: true, inQuery: true })
  colours?: string[];

  @Text({ label: 'name', minLength: 1, maxLength: 5, optional: true })
  name?: string;
}

const valid = { band: { upper: 20_000 } };

async function read<Dto>(value: object, metatype: new () => Dto, type: 'body' | 'query'): Promise<Dto> {
  return (await createValidationPipe().transform(value, { type, metatype })) as Dto;
}

async function fieldErrors(value: object): Promise<Record<string, string>> {
  try {
    await read(value, RequestDto, 'body');
    return {};
  } catch (error) {
    const { errors = [] } = error as DomainError;
    return Object.fromEntries(errors.map(({ field, message }) => [field, message]));
  }
}

describe('request validation', () => {
  it('takes what is within the catalogue’s bounds', async () => {
    expect(
      await fieldErrors({ ...valid, channels: 2, colour: 'red', colours: ['green'], name: 'Ω' }),
    ).toEqual({});
    expect(await fieldErrors({ ...valid, channels: null })).toEqual({});
    expect(await fieldErrors({ ...valid, channels: 'auto' })).toEqual({});
  });

  it.each([
    [{ band: { upper: -1 } }, 'band.upper', 'upper band limit: a value from 1 µHz to 1 THz was expected'],
    [{ band: { upper: '20' } }, 'band.upper', 'upper band limit: a number was expected'],
    [{ band: { upper: Infinity } }, 'band.upper', 'upper band limit: a number was expected'],
    [{ band: { upper: null } }, 'band.upper', 'upper band limit: a number was expected'],
    [{ band: {} }, 'band.upper', 'upper band limit: a number was expected'],
    [{ band: { upper: 1, lower: 1 } }, 'band.lower', 'unknown field'],
    [{ band: 7 }, 'band', 'an object was expected'],
    [{ band: [valid.band] }, 'band', 'an object was expected'],
    [{}, 'band', 'an object was expected'],
    [{ ...valid, channels: 1.5 }, 'channels', 'channels, at least: a whole number was expected'],
    [{ ...valid, channels: 'many' }, 'channels', 'channels, at least: a number was expected'],
    [{ ...valid, colour: 'blue' }, 'colour', 'one of these was expected: red, green'],
    [{ ...valid, colour: null }, 'colour', 'one of these was expected: red, green'],
    [{ ...valid, colours: ['red', 'blue'] }, 'colours', 'a list of these was expected: red, green'],
    [{ ...valid, colours: ['red', 'red', 'red'] }, 'colours', 'a list of these was expected: red, green'],
    [{ ...valid, colours: { 0: 'red' } }, 'colours', 'a list of these was expected: red, green'],
    [{ ...valid, name: ' ' }, 'name', 'name: must not be empty'],
    [{ ...valid, name: 'far too long' }, 'name', 'name: at most 5 characters were expected'],
    [{ ...valid, name: 'a\u0000' }, 'name', 'name: a text without control characters was expected'],
    [{ ...valid, name: '\ud800' }, 'name', 'name: a text without control characters was expected'],
  ])('names what is wrong in %j', async (body, field, message) => {
    const errors = await fieldErrors(body);
    expect(Object.keys(errors)).toEqual([field]);
    expect(errors[field].replaceAll('\u2009', ' ')).toBe(message);
  });

  it('reads a list from one text with commas in a query', async () => {
    expect(await read({ ...valid, colours: 'red,green' }, RequestDto, 'query')).toMatchObject({
      colours: COLOURS,
    });
  });
});

describe('list query', () => {
  it('begins at the first item and takes fifty', async () => {
    expect(await read({}, ListQueryDto, 'query')).toEqual({ limit: 50, offset: 0 });
    expect(await read({ limit: '1000', offset: '7' }, ListQueryDto, 'query')).toEqual({
      limit: 1000,
      offset: 7,
    });
  });

  it.each([
    { limit: '0' },
    { limit: '1001' },
    { limit: '1.5' },
    { limit: 'ten' },
    { limit: ['1', '2'] },
    { offset: '-1' },
    { offset: '1e99' },
    { search: 'x'.repeat(201) },
    { search: ['a', 'b'] },
    { page: '2' },
  ])('refuses %j', async (query) => {
    await expect(read(query, ListQueryDto, 'query')).rejects.toBeInstanceOf(DomainError);
  });
});
