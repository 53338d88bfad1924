import { AuditEntry } from '../audit/entities/audit-entry.entity.js';
import { AccountToken } from '../auth/entities/account-token.entity.js';
import { AttemptCount } from '../auth/entities/attempt-count.entity.js';
import { Session } from '../auth/entities/session.entity.js';
import { BillingEvent } from '../billing/entities/billing-event.entity.js';
import { SavedConditions } from '../conditions/entities/saved-conditions.entity.js';
import { SavedConditionsPart } from '../conditions/entities/saved-conditions-part.entity.js';
import { Import } from '../imports/entities/import.entity.js';
import { ImportPortion } from '../imports/entities/import-portion.entity.js';
import { ImportProgress } from '../imports/entities/import-progress.entity.js';
import { Library } from '../library/entities/library.entity.js';
import { OpAmp } from '../library/entities/op-amp.entity.js';
import { Part } from '../library/entities/part.entity.js';
import { Resistor } from '../library/entities/resistor.entity.js';
import { StandingBefore } from '../library/entities/standing-before.entity.js';
import { StandingChange } from '../library/entities/standing-change.entity.js';
import { Subscription } from '../plans/entities/subscription.entity.js';
import { OutboxMail } from '../mail/entities/outbox-mail.entity.js';
import { RefusedMail } from '../mail/entities/refused-mail.entity.js';
import { PartWatch } from '../notices/entities/part-watch.entity.js';
import { PriceDigest } from '../notices/entities/price-digest.entity.js';
import { KeptPair } from '../parts/entities/kept-pair.entity.js';
import { ExchangeRate } from '../prices/entities/exchange-rate.entity.js';
import { Offer } from '../prices/entities/offer.entity.js';
import { OfferBreak } from '../prices/entities/offer-break.entity.js';
import { PriceSettings } from '../prices/entities/price-settings.entity.js';
import { Supplier } from '../prices/entities/supplier.entity.js';
import { Invitation } from '../teams/invitations/entities/invitation.entity.js';
import { Membership } from '../teams/entities/membership.entity.js';
import { Team } from '../teams/entities/team.entity.js';
import { RequestCount } from '../throttling/entities/request-count.entity.js';
import { User } from '../users/entities/user.entity.js';

/** The entities of all features. */
export const ENTITIES = [
  Team,
  User,
  Membership,
  Invitation,
  Subscription,
  BillingEvent,
  Library,
  Part,
  OpAmp,
  Resistor,
  StandingChange,
  StandingBefore,
  KeptPair,
  SavedConditions,
  SavedConditionsPart,
  AuditEntry,
  PriceSettings,
  ExchangeRate,
  Supplier,
  Offer,
  OfferBreak,
  Import,
  ImportPortion,
  ImportProgress,
  Session,
  AccountToken,
  AttemptCount,
  RequestCount,
  OutboxMail,
  RefusedMail,
  PriceDigest,
  PartWatch,
];
