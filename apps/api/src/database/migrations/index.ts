import { Migration20261201081617_takesAndSheets } from './20261201081617-takes-and-sheets';
import { Migration20261201091134_tagsAndFollowers } from './20261201091134-tags-and-followers';
import { Migration20261201091810_shares } from './20261201091810-shares';
import { Migration20261201092034_settings } from './20261201092034-settings';
import { Migration20261201092459_oneTimeTokens } from './20261201092459-one-time-tokens';
import { Migration20261201093300_tellOfChanges } from './20261201093300-tell-of-changes';
import { Migration20261201093647_measureAgain } from './20261201093647-measure-again';
import { Migration20261201120050_tryOuts } from './20261201120050-try-outs';
import { Migration20261201122137_setupsAndPhotos } from './20261201122137-setups-and-photos';
import { Migration20261201122700_whatTheRecorderWrote } from './20261201122700-what-the-recorder-wrote';
import { Migration20261201132900_renewalsAndTopics } from './20261201132900-renewals-and-topics';
import { Migration20261201133500_findSameFiles } from './20261201133500-find-same-files';
import { Migration20261201134300_rooms } from './20261201134300-rooms';
import { Migration20261201135100_addedFiles } from './20261201135100-added-files';
import { Migration20261201152212_sharesOfMore } from './20261201152212-shares-of-more';
import { Migration20261201153500_settingsOfAnAccount } from './20261201153500-settings-of-an-account';
import { Migration20261201160500_mailRefusals } from './20261201160500-mail-refusals';
import { Migration20261201161841_notes } from './20261201161841-notes';
import { Migration20261201164500_winnersAndUndo } from './20261201164500-winners-and-undo';
import { Migration20261201165900_roomPhotos } from './20261201165900-room-photos';

/** In order; a new migration is added at the end and never changed once merged. */
export const migrations = [
  { name: '20261201081617-takes-and-sheets', class: Migration20261201081617_takesAndSheets },
  { name: '20261201091134-tags-and-followers', class: Migration20261201091134_tagsAndFollowers },
  { name: '20261201091810-shares', class: Migration20261201091810_shares },
  { name: '20261201092034-settings', class: Migration20261201092034_settings },
  { name: '20261201092459-one-time-tokens', class: Migration20261201092459_oneTimeTokens },
  { name: '20261201093300-tell-of-changes', class: Migration20261201093300_tellOfChanges },
  { name: '20261201093647-measure-again', class: Migration20261201093647_measureAgain },
  { name: '20261201120050-try-outs', class: Migration20261201120050_tryOuts },
  { name: '20261201122137-setups-and-photos', class: Migration20261201122137_setupsAndPhotos },
  { name: '20261201122700-what-the-recorder-wrote', class: Migration20261201122700_whatTheRecorderWrote },
  { name: '20261201132900-renewals-and-topics', class: Migration20261201132900_renewalsAndTopics },
  { name: '20261201133500-find-same-files', class: Migration20261201133500_findSameFiles },
  { name: '20261201134300-rooms', class: Migration20261201134300_rooms },
  { name: '20261201135100-added-files', class: Migration20261201135100_addedFiles },
  { name: '20261201152212-shares-of-more', class: Migration20261201152212_sharesOfMore },
  { name: '20261201153500-settings-of-an-account', class: Migration20261201153500_settingsOfAnAccount },
  { name: '20261201160500-mail-refusals', class: Migration20261201160500_mailRefusals },
  { name: '20261201161841-notes', class: Migration20261201161841_notes },
  { name: '20261201164500-winners-and-undo', class: Migration20261201164500_winnersAndUndo },
  { name: '20261201165900-room-photos', class: Migration20261201165900_roomPhotos },
];
