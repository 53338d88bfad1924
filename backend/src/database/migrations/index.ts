import { CreateTeamsAndMembers1767000000000 } from './1767000000000-CreateTeamsAndMembers.js';
import { CreateLibrariesAndParts1767100000000 } from './1767100000000-CreateLibrariesAndParts.js';
import { CreateSavedConditions1767200000000 } from './1767200000000-CreateSavedConditions.js';
import { CreateResistors1767300000000 } from './1767300000000-CreateResistors.js';
import { CreateAuditEntries1796083100000 } from './1796083100000-CreateAuditEntries.js';
import { CreatePrices1796083200000 } from './1796083200000-CreatePrices.js';
import { CreateImports1796083300000 } from './1796083300000-CreateImports.js';
import { CreateMail1796090100000 } from './1796090100000-CreateMail.js';
import { CreateAccounts1796090200000 } from './1796090200000-CreateAccounts.js';
import { CreateSubscriptions1796090300000 } from './1796090300000-CreateSubscriptions.js';
import { CreateBillingEvents1796090310000 } from './1796090310000-CreateBillingEvents.js';
import { AddPriceLists1796090400000 } from './1796090400000-AddPriceLists.js';
import { CreateKeptPairs1796090500000 } from './1796090500000-CreateKeptPairs.js';
import { NameAuditObjects1796090600000 } from './1796090600000-NameAuditObjects.js';
import { AddTeamOwners1796090600100 } from './1796090600100-AddTeamOwners.js';
import { CreateInvitations1796090600200 } from './1796090600200-CreateInvitations.js';
import { AddPartsOfConditions1796090900000 } from './1796090900000-AddPartsOfConditions.js';
import { KeepEarlierConfirmations1796090901000 } from './1796090901000-KeepEarlierConfirmations.js';
import { CreateNotices1796091000000 } from './1796091000000-CreateNotices.js';
import { EndSessionsWithMembership1796091100000 } from './1796091100000-EndSessionsWithMembership.js';
import { CreateStandingChanges1796103000000 } from './1796103000000-CreateStandingChanges.js';
import { CountRequests1796105000000 } from './1796105000000-CountRequests.js';
import { RememberOpenTeams1796105001000 } from './1796105001000-RememberOpenTeams.js';

/** All migrations; they run in the order of the time in their names. */
export const MIGRATIONS = [
  CreateTeamsAndMembers1767000000000,
  CreateLibrariesAndParts1767100000000,
  CreateSavedConditions1767200000000,
  CreateResistors1767300000000,
  CreateAuditEntries1796083100000,
  CreatePrices1796083200000,
  CreateImports1796083300000,
  CreateMail1796090100000,
  CreateAccounts1796090200000,
  CreateSubscriptions1796090300000,
  CreateBillingEvents1796090310000,
  AddPriceLists1796090400000,
  CreateKeptPairs1796090500000,
  NameAuditObjects1796090600000,
  AddTeamOwners1796090600100,
  CreateInvitations1796090600200,
  AddPartsOfConditions1796090900000,
  KeepEarlierConfirmations1796090901000,
  CreateNotices1796091000000,
  EndSessionsWithMembership1796091100000,
  CreateStandingChanges1796103000000,
  CountRequests1796105000000,
  RememberOpenTeams1796105001000,
];
