import { ORIGINS } from '@roothertz/common/parts';
import { Option } from '../validation/option.decorator.js';
import { defineParameters } from './parameter-properties.js';

/** Where the figures come from; one that isn't stated is a data sheet's typical value. */
export class OriginsDto {}
defineParameters(OriginsDto, () => Option(ORIGINS, { optional: true }));

/** As a change states it: what is left out stays, null takes a statement back. */
export class OriginsChangeDto {}
defineParameters(OriginsChangeDto, () => Option(ORIGINS, { optional: true, nullable: true }));
