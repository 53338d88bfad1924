import { SavedConditions } from '../conditions/entities/saved-conditions.entity.js';
import { Library } from '../library/entities/library.entity.js';
import { OpAmp } from '../library/entities/op-amp.entity.js';
import { Part } from '../library/entities/part.entity.js';
import { Resistor } from '../library/entities/resistor.entity.js';
import { Membership } from '../teams/entities/membership.entity.js';
import { Team } from '../teams/entities/team.entity.js';
import { User } from '../users/entities/user.entity.js';

/** The entities of all features. */
export const ENTITIES = [Team, User, Membership, Library, Part, OpAmp, Resistor, SavedConditions];
