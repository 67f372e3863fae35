import { addItem } from "./agreements/add-item";
import { changeItem } from "./agreements/change-item";
import { createAgreement } from "./agreements/create-agreement";
import { endAgreement } from "./agreements/end-agreement";
import { endItem } from "./agreements/end-item";
import { getAgreement } from "./agreements/get-agreement";
import { listAgreements } from "./agreements/list-agreements";
import { recordCompletion } from "./agreements/record-completion";
import { updateAgreement } from "./agreements/update-agreement";
import { listAudit } from "./audit/list-audit";
import type { Verb } from "./command";
import { getCompany } from "./company/get-company";
import { getFrame } from "./company/get-frame";
import { updateCompany } from "./company/update-company";
import { addContact } from "./customers/add-contact";
import { createCustomer } from "./customers/create-customer";
import { endContact } from "./customers/end-contact";
import { getCustomer } from "./customers/get-customer";
import { inviteContact } from "./customers/invite-contact";
import { listCustomerChoices } from "./customers/list-customer-choices";
import { listCustomers } from "./customers/list-customers";
import { updateCustomer } from "./customers/update-customer";
import { find } from "./find/find";
import { getSiteBrief } from "./find/get-site-brief";
import { importLists } from "./imports/import-lists";
import { previewImport } from "./imports/preview-import";
import { cancelJob } from "./jobs/cancel-job";
import { createJob } from "./jobs/create-job";
import { endWait } from "./jobs/end-wait";
import { getJob } from "./jobs/get-job";
import { listDue } from "./jobs/list-due";
import { listJobs } from "./jobs/list-jobs";
import { makeDue } from "./jobs/make-due";
import { recordDone } from "./jobs/record-done";
import { setTerms } from "./jobs/set-terms";
import { sweepDue } from "./jobs/sweep-due";
import { updateJob } from "./jobs/update-job";
import { waitFor } from "./jobs/wait-for";
import { listDeadLetters } from "./messages/list-dead-letters";
import { retryDeadLetter } from "./messages/retry-dead-letter";
import { sendPasswordReset } from "./messages/send-password-reset";
import { sendSignInLink } from "./messages/send-sign-in-link";
import { acceptInvitation } from "./people/accept-invitation";
import { changePassword } from "./people/change-password";
import { changeRole } from "./people/change-role";
import { endMembership } from "./people/end-membership";
import { endSession } from "./people/end-session";
import { enterCompany } from "./people/enter-company";
import { foundCompany } from "./people/found-company";
import { getAccount } from "./people/get-account";
import { getPerson } from "./people/get-person";
import { inviteStaff } from "./people/invite-staff";
import { listPeople } from "./people/list-people";
import { recordLicense } from "./people/record-license";
import { resendInvitation } from "./people/resend-invitation";
import { resetPassword } from "./people/reset-password";
import { restoreMembership } from "./people/restore-membership";
import { setHome } from "./people/set-home";
import { signOutEverywhere } from "./people/sign-out-everywhere";
import { getPlaces } from "./planning/get-places";
import { getMatrix } from "./sequences/get-matrix";
import { getScript } from "./sequences/get-script";
import { listVersions } from "./sequences/list-versions";
import { saveMatrix } from "./sequences/save-matrix";
import { addDocument } from "./sites/add-document";
import { addHolder } from "./sites/add-holder";
import { addKey } from "./sites/add-key";
import { addSecret } from "./sites/add-secret";
import { addStationAccount } from "./sites/add-station-account";
import { createSite } from "./sites/create-site";
import { endDocument } from "./sites/end-document";
import { endHolder } from "./sites/end-holder";
import { endKey } from "./sites/end-key";
import { endSecret } from "./sites/end-secret";
import { endStationAccount } from "./sites/end-station-account";
import { getSite } from "./sites/get-site";
import { getSiteFacts } from "./sites/get-site-facts";
import { handOverKey } from "./sites/hand-over-key";
import { listSites } from "./sites/list-sites";
import { lookAtSecret } from "./sites/look-at-secret";
import { updateSite } from "./sites/update-site";
import { addSystem } from "./systems/add-system";
import { changeSystem } from "./systems/change-system";
import { getOutputs } from "./systems/get-outputs";
import { getSystem } from "./systems/get-system";
import { listPoints } from "./systems/list-points";
import { putBackEntry } from "./systems/put-back-entry";
import { removeEntry } from "./systems/remove-entry";
import { saveEquipment } from "./systems/save-equipment";
import { saveGroup } from "./systems/save-group";
import { saveOutput } from "./systems/save-output";
import { savePoint } from "./systems/save-point";
import { saveZone } from "./systems/save-zone";
import { answerVisit } from "./visits/answer";
import { askForVisit } from "./visits/ask";
import { cancelVisit } from "./visits/cancel-visit";
import { getAsked } from "./visits/get-asked";
import { getFieldDay } from "./visits/get-field-day";
import { getOverview } from "./visits/get-overview";
import { getPortal } from "./visits/get-portal";
import { getReasons } from "./visits/get-reasons";
import { getRunSheet } from "./visits/get-run-sheet";
import { getVisit } from "./visits/get-visit";
import { moveVisit } from "./visits/move-visit";
import { planVisit } from "./visits/plan-visit";
import { recordAnswer } from "./visits/record-answer";
import { swapVisits } from "./visits/swap-visits";
import { addAttendance } from "./windows/add-attendance";
import { addNoTest } from "./windows/add-no-test";
import { addWindow } from "./windows/add-window";
import { endAttendance } from "./windows/end-attendance";
import { endNoTest } from "./windows/end-no-test";
import { endWindow } from "./windows/end-window";

/** Everything that can be done or read. Doors (actions, routes, worker, sync) take verbs from nowhere else. */
export const COMMANDS: readonly Verb[] = [
  foundCompany,
  updateCompany,
  addContact,
  createCustomer,
  endContact,
  updateCustomer,
  createJob,
  addItem,
  changeItem,
  createAgreement,
  endAgreement,
  endItem,
  recordCompletion,
  updateAgreement,
  cancelJob,
  endWait,
  makeDue,
  recordDone,
  setTerms,
  sweepDue,
  updateJob,
  waitFor,
  retryDeadLetter,
  sendPasswordReset,
  sendSignInLink,
  acceptInvitation,
  changePassword,
  changeRole,
  endMembership,
  endSession,
  enterCompany,
  inviteContact,
  inviteStaff,
  recordLicense,
  resendInvitation,
  resetPassword,
  restoreMembership,
  setHome,
  signOutEverywhere,
  addHolder,
  createSite,
  endHolder,
  updateSite,
  answerVisit,
  askForVisit,
  cancelVisit,
  moveVisit,
  planVisit,
  recordAnswer,
  swapVisits,
  saveMatrix,
  addDocument,
  addKey,
  addSecret,
  addStationAccount,
  endDocument,
  endKey,
  endSecret,
  endStationAccount,
  handOverKey,
  lookAtSecret,
  importLists,
  addSystem,
  changeSystem,
  putBackEntry,
  removeEntry,
  saveEquipment,
  saveGroup,
  saveOutput,
  savePoint,
  saveZone,
  addAttendance,
  addNoTest,
  addWindow,
  endAttendance,
  endNoTest,
  endWindow,
];

export const QUERIES: readonly Verb[] = [
  listAudit,
  getCompany,
  getFrame,
  getCustomer,
  listCustomerChoices,
  listCustomers,
  find,
  getSiteBrief,
  listJobs,
  getAgreement,
  listAgreements,
  getJob,
  listDue,
  listDeadLetters,
  getAccount,
  getPerson,
  listPeople,
  getSite,
  listSites,
  getFieldDay,
  getPortal,
  getOverview,
  getRunSheet,
  getAsked,
  getPlaces,
  getReasons,
  getVisit,
  getSiteFacts,
  previewImport,
  getMatrix,
  getScript,
  listVersions,
  getOutputs,
  getSystem,
  listPoints,
];
