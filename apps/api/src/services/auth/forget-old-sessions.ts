import { Op } from 'sequelize';
import { RefreshSession } from '../../models/refresh-session.ts';
import { SessionFamily } from '../../models/session-family.ts';
import { REFRESH_SECONDS } from './session-cookies.ts';

/** How long an ended session is kept, so that the use of a stolen token of it is still told apart from nonsense. */
const KEPT_MS = 30 * 24 * 3600 * 1000;

/** Removes sessions that ended long ago, and those whose every token has expired. Returns how many. */
export async function forgetOldSessions(): Promise<number> {
  const live = await RefreshSession.findAll({
    where: { expiresAt: { [Op.gt]: new Date(Date.now() - KEPT_MS) } },
    attributes: ['familyId'],
    group: 'familyId',
  });
  return SessionFamily.destroy({
    where: {
      [Op.or]: [
        { endedAt: { [Op.lt]: new Date(Date.now() - KEPT_MS) } },
        {
          createdAt: { [Op.lt]: new Date(Date.now() - KEPT_MS - REFRESH_SECONDS * 1000) },
          id: { [Op.notIn]: live.map(({ familyId }) => familyId) },
        },
      ],
    },
  });
}
