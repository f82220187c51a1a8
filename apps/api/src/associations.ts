import { AirfoilRecord } from './models/airfoil-record.ts';
import { AuditEventRecord } from './models/audit-event-record.ts';
import { Credential } from './models/credential.ts';
import { Decision } from './models/decision.ts';
import { Design } from './models/design.ts';
import { Draft } from './models/draft.ts';
import { Membership } from './models/membership.ts';
import { OneTimeLink } from './models/one-time-link.ts';
import { Person } from './models/person.ts';
import { Programme } from './models/programme.ts';
import { RefreshSession } from './models/refresh-session.ts';
import { Release } from './models/release.ts';
import { Review } from './models/review.ts';
import { ReviewComment } from './models/review-comment.ts';
import { ReviewWithdrawal } from './models/review-withdrawal.ts';
import { SessionFamily } from './models/session-family.ts';
import { SpecificationIssue } from './models/specification-issue.ts';
import { Version } from './models/version.ts';
import { VersionState } from './models/version-state.ts';

function associatePeople(): void {
  Person.hasOne(Credential, { as: 'credential', foreignKey: 'personId' });
  Person.hasMany(Membership, { as: 'memberships', foreignKey: 'personId' });
  Membership.belongsTo(Person, { as: 'person', foreignKey: 'personId' });
  Membership.belongsTo(Programme, { as: 'programme', foreignKey: 'programmeId' });
  SessionFamily.belongsTo(Person, { as: 'person', foreignKey: 'personId' });
  RefreshSession.belongsTo(SessionFamily, { as: 'family', foreignKey: 'familyId' });
  OneTimeLink.belongsTo(Person, { as: 'person', foreignKey: 'personId' });
}

function associateProgrammes(): void {
  Programme.hasMany(Membership, { as: 'memberships', foreignKey: 'programmeId' });
  Programme.belongsTo(Person, { as: 'creator', foreignKey: 'createdBy' });
  Programme.hasMany(SpecificationIssue, { as: 'specifications', foreignKey: 'programmeId' });
  Programme.hasMany(Design, { as: 'designs', foreignKey: 'programmeId' });
  Programme.hasMany(Release, { as: 'releases', foreignKey: 'programmeId' });
  SpecificationIssue.belongsTo(Person, { as: 'issuer', foreignKey: 'issuedBy' });
  AirfoilRecord.belongsTo(Person, { as: 'adder', foreignKey: 'addedBy' });
  AuditEventRecord.belongsTo(Person, { as: 'actor', foreignKey: 'actorId' });
}

function associateDesigns(): void {
  Design.belongsTo(Programme, { as: 'programme', foreignKey: 'programmeId' });
  Design.belongsTo(Person, { as: 'creator', foreignKey: 'createdBy' });
  Design.hasMany(Version, { as: 'versions', foreignKey: 'designId' });
  Design.hasMany(Draft, { as: 'drafts', foreignKey: 'designId' });
  Draft.belongsTo(Design, { as: 'design', foreignKey: 'designId' });
  Draft.belongsTo(Version, { as: 'parent', foreignKey: 'parentVersionId' });
  Version.belongsTo(Design, { as: 'design', foreignKey: 'designId' });
  Version.belongsTo(Version, { as: 'parent', foreignKey: 'parentId' });
  Version.belongsTo(Person, { as: 'author', foreignKey: 'authorId' });
  Version.hasOne(VersionState, { as: 'state', foreignKey: 'versionId' });
  Version.hasMany(Review, { as: 'reviews', foreignKey: 'versionId' });
}

function associateReviews(): void {
  Review.belongsTo(Version, { as: 'version', foreignKey: 'versionId' });
  Review.belongsTo(Person, { as: 'asker', foreignKey: 'askedBy' });
  Review.hasMany(ReviewComment, { as: 'comments', foreignKey: 'reviewId' });
  Review.hasOne(Decision, { as: 'decision', foreignKey: 'reviewId' });
  Review.hasOne(ReviewWithdrawal, { as: 'withdrawal', foreignKey: 'reviewId' });
  ReviewComment.belongsTo(Review, { as: 'review', foreignKey: 'reviewId' });
  ReviewComment.belongsTo(Person, { as: 'author', foreignKey: 'authorId' });
  ReviewComment.belongsTo(Person, { as: 'resolver', foreignKey: 'resolvedBy' });
  Decision.belongsTo(Person, { as: 'decider', foreignKey: 'decidedBy' });
  Release.belongsTo(Programme, { as: 'programme', foreignKey: 'programmeId' });
  Release.belongsTo(Version, { as: 'version', foreignKey: 'versionId' });
  Release.belongsTo(Person, { as: 'releaser', foreignKey: 'releasedBy' });
}

/** How the records hang together; the models themselves know nothing of one another. */
export function associate(): void {
  associatePeople();
  associateProgrammes();
  associateDesigns();
  associateReviews();
}
