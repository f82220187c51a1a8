import type { Operation } from './operation.ts';
import { getSession } from './auth/get-session.ts';
import { signIn } from './auth/sign-in.ts';
import { refreshSession } from './auth/refresh-session.ts';
import { signOut } from './auth/sign-out.ts';
import { signOutEverywhere } from './auth/sign-out-everywhere.ts';
import { changePassword } from './auth/change-password.ts';
import { requestPasswordReset } from './auth/request-password-reset.ts';
import { resetPassword } from './auth/reset-password.ts';
import { acceptInvitation } from './auth/accept-invitation.ts';
import { listPeople } from './people/list-people.ts';
import { invitePerson } from './people/invite-person.ts';
import { resendInvitation } from './people/resend-invitation.ts';
import { updatePerson } from './people/update-person.ts';
import { listMembers } from './people/list-members.ts';
import { setMember } from './people/set-member.ts';
import { removeMember } from './people/remove-member.ts';
import { listProgrammes } from './programmes/list-programmes.ts';
import { createProgramme } from './programmes/create-programme.ts';
import { getProgramme } from './programmes/get-programme.ts';
import { updateProgramme } from './programmes/update-programme.ts';
import { listSpecifications } from './programmes/list-specifications.ts';
import { issueSpecification } from './programmes/issue-specification.ts';
import { listAirfoils } from './airfoils/list-airfoils.ts';
import { getAirfoil } from './airfoils/get-airfoil.ts';
import { addAirfoil } from './airfoils/add-airfoil.ts';
import { listDesigns } from './designs/list-designs.ts';
import { createDesign } from './designs/create-design.ts';
import { getDesign } from './designs/get-design.ts';
import { renameDesign } from './designs/rename-design.ts';
import { evaluateContent } from './designs/evaluate-content.ts';
import { listDrafts } from './drafts/list-drafts.ts';
import { openDraft } from './drafts/open-draft.ts';
import { getDraft } from './drafts/get-draft.ts';
import { saveDraft } from './drafts/save-draft.ts';
import { discardDraft } from './drafts/discard-draft.ts';
import { saveVersion } from './versions/save-version.ts';
import { listVersions } from './versions/list-versions.ts';
import { getVersion } from './versions/get-version.ts';
import { listReviews } from './reviews/list-reviews.ts';
import { askForReview } from './reviews/ask-for-review.ts';
import { getReview } from './reviews/get-review.ts';
import { addComment } from './reviews/add-comment.ts';
import { resolveComment } from './reviews/resolve-comment.ts';
import { decideReview } from './reviews/decide-review.ts';
import { withdrawReview } from './reviews/withdraw-review.ts';
import { releaseVersion } from './releases/release-version.ts';
import { listReleases } from './releases/list-releases.ts';
import { getRelease } from './releases/get-release.ts';
import { downloadPackage } from './releases/download-package.ts';
import { listAuditEvents } from './audit/list-audit-events.ts';
import { verifyAudit } from './audit/verify-audit.ts';
import { listCaughtMail } from './mail/list-caught-mail.ts';
import { getHealth } from './system/get-health.ts';
import { getOpenapi } from './system/get-openapi.ts';

/** Every operation of the API: routes, OpenAPI and the table of rights are checked against this list. */
export const operations: readonly Operation[] = [
  getSession,
  signIn,
  refreshSession,
  signOut,
  signOutEverywhere,
  changePassword,
  requestPasswordReset,
  resetPassword,
  acceptInvitation,
  listPeople,
  invitePerson,
  resendInvitation,
  updatePerson,
  listMembers,
  setMember,
  removeMember,
  listProgrammes,
  createProgramme,
  getProgramme,
  updateProgramme,
  listSpecifications,
  issueSpecification,
  listAirfoils,
  getAirfoil,
  addAirfoil,
  listDesigns,
  createDesign,
  getDesign,
  renameDesign,
  evaluateContent,
  listDrafts,
  openDraft,
  getDraft,
  saveDraft,
  discardDraft,
  saveVersion,
  listVersions,
  getVersion,
  listReviews,
  askForReview,
  getReview,
  addComment,
  resolveComment,
  decideReview,
  withdrawReview,
  releaseVersion,
  listReleases,
  getRelease,
  downloadPackage,
  listAuditEvents,
  verifyAudit,
  listCaughtMail,
  getHealth,
  getOpenapi,
];
