import type { Letter } from '../../services/mail/write-mail.ts';
import { SIGNATURE } from './signature.ts';

interface Given {
  readonly programmeName: string;
  readonly designName: string;
  readonly versionLabel: string;
  readonly writtenBy: string;
  /** Radius of the station it is pinned to (m), null for the version as a whole. */
  readonly stationRadiusM: number | null;
  readonly text: string;
  readonly link: string;
}

/** To the author of the version. */
export function reviewCommentedLetter(given: Given): Letter {
  const where =
    given.stationRadiusM === null ? '' : ` at the station r = ${given.stationRadiusM.toFixed(3)} m`;
  return {
    kind: 'review-commented',
    subject: `Comment: ${given.designName} ${given.versionLabel} (${given.programmeName})`,
    text: `${given.writtenBy} commented on ${given.designName} ${given.versionLabel}${where}:

${given.text}

${given.link}
${SIGNATURE}`,
  };
}
