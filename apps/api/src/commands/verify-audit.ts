import { ConfigError } from '../config/config-error.ts';
import { connect } from '../db/connect.ts';
import { verifyAudit } from '../services/audit/verify-audit.ts';
import { runProgram } from './run-program.ts';

/** Walks the audit chain of DATABASE_URL. Exit code 0: it holds; 1: it is broken; 2: it could not be read. */
runProgram(async () => {
  const url = process.env['DATABASE_URL'];
  if (url === undefined)
    throw new ConfigError(['DATABASE_URL is missing; allowed: a postgres:// address of tipward_app']);
  const db = connect(url, 2);
  try {
    const { holds, events, firstBroken, lastHash } = await verifyAudit();
    process.stdout.write(
      holds
        ? `The audit chain holds: ${events} events, last hash ${lastHash}\n`
        : `The audit chain is BROKEN at event ${String(firstBroken)}: ${events} events before it hold, last hash ${lastHash}\n`,
    );
    return holds ? 0 : 1;
  } finally {
    await db.close();
  }
});
