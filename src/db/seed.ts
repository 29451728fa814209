import { sql } from 'drizzle-orm';
import { hashPassword } from '../server/accounts/passwords.ts';
import { appendAudit } from '../server/audit/log.ts';
import { demonstrationRecords } from '../server/demonstration/cases.ts';
import { demonstrationPeople } from '../server/demonstration-people.ts';
import { openDatabase } from './client.ts';
import { caseRevisions, cases, people, recipients, units } from './schema.ts';

/** Fills an empty database with the demonstration unit; leaves any other alone. */
const connectionString = process.env.DATABASE_URL;
if (process.env.DEMONSTRATION !== 'true' || connectionString === undefined) {
  console.error('The demonstration unit is set up only in demonstration mode, with DATABASE_URL.');
  process.exit(1);
}

const pad = (value: number) => String(value).padStart(2, '0');
const now = new Date();
const today = `${now.getFullYear()}-${pad(now.getMonth() + 1)}-${pad(now.getDate())}`;
const { db, pool } = openDatabase(connectionString);

await db.transaction(async (tx) => {
  // Two processes may find the database empty at once.
  await tx.execute(sql`select pg_advisory_xact_lock(7281944)`);
  if ((await tx.select({ id: units.id }).from(units).limit(1)).length > 0) return;
  const [unit] = await tx
    .insert(units)
    .values({
      name: 'Larkfield Eye Unit',
      service: 'Retinal service',
      address: '1 Meadow Lane, Larkfield',
      telephone: '01632 960000',
      email: 'unit@example.org',
      demonstration: true,
    })
    .returning();
  if (unit === undefined) throw new Error('The unit could not be added.');
  const rows = await Promise.all(
    demonstrationPeople.map(async ({ name, title, email, role, password }) => ({
      unitId: unit.id,
      name,
      title,
      email,
      roles: [role],
      passwordHash: await hashPassword(password),
    })),
  );
  const added = await tx.insert(people).values(rows).returning();
  const secretary = added.find(({ roles }) => roles.includes('secretary'));
  const at = { unitId: unit.id, confirmedBy: secretary?.id ?? null, confirmedAt: now };
  await tx.insert(recipients).values([
    {
      ...at,
      name: 'Fern Mossgrove',
      kind: 'optometrist',
      practice: 'Mossgrove Opticians',
      address: '4 High Street, Larkfield',
      email: 'fern@example.org',
    },
    {
      ...at,
      name: 'Bram Larkwood',
      kind: 'optometrist',
      practice: 'Larkwood Eye Care',
      address: '18 Mill Road, Larkfield',
      email: 'bram@example.org',
    },
    {
      ...at,
      name: 'Dr Hazel Underwillow',
      kind: 'family-doctor',
      practice: 'Willow Surgery',
      address: '2 Brook Lane, Larkfield',
      email: 'hazel@example.org',
    },
    {
      unitId: unit.id,
      name: 'Dr Perrin Alderbank',
      kind: 'family-doctor',
      practice: 'Alderbank Practice',
      address: '9 Bridge Street, Larkfield',
      email: 'perrin@example.org',
    },
  ]);
  for (const [index, record] of demonstrationRecords(today).entries()) {
    const [row] = await tx
      .insert(cases)
      .values({ unitId: unit.id, listDate: today, position: index + 1, record })
      .returning();
    if (row !== undefined)
      await tx.insert(caseRevisions).values({ caseId: row.id, revision: 1, record, answers: [] });
  }
  await appendAudit(tx, { personId: null, unitId: unit.id }, 'unit:demonstration', unit.id);
});
await pool.end();
