import { QueryTypes, type Sequelize } from 'sequelize';

const ALL = 'SELECT, INSERT, UPDATE, DELETE';

/** Columns of `slings` that the working account may write; state, custody and chain move by ledger rows alone. */
const SLING_COLUMNS = [
  'number',
  'maker',
  'maker_serial',
  'service_class',
  'reach_mm',
  'vertical_kg',
  'choker_kg',
  'basket_kg',
  'bridle_kg',
  'bridle_angle_deg',
  'entered_units',
  'makers_tag',
  'site_id',
  'home_location_id',
  'notes',
  'cost',
  'next_due_on',
  'first_use_on',
];

/** What the working account may do, table by table: least privilege, no right to change tables or triggers. */
const GRANTS: Record<string, string> = {
  sites: 'SELECT, INSERT',
  locations: 'SELECT, INSERT',
  users: 'SELECT, INSERT, UPDATE',
  user_sites: 'SELECT, INSERT, DELETE',
  designations: 'SELECT, INSERT, UPDATE (ended_at)',
  invitations: 'SELECT, INSERT, UPDATE (used_at)',
  sessions: ALL,
  idempotency_keys: ALL,
  files: 'SELECT, INSERT',
  slings: `SELECT, INSERT, UPDATE (${SLING_COLUMNS.join(', ')})`,
  sling_fittings: 'SELECT, INSERT',
  certificates: 'SELECT, INSERT',
  sling_photos: 'SELECT, INSERT',
  ledger: 'SELECT, INSERT',
  lifecycle_transitions: 'SELECT',
  hold_reasons:
    'SELECT, INSERT, UPDATE (confirmed, withdrawn_seq, cleared_by, cleared_at, cleared_seq, clear_note, evidence_file_id)',
  inspections: 'SELECT, INSERT',
  damage_reports: 'SELECT, INSERT',
  label_runs: 'SELECT, INSERT',
  tags: 'SELECT, INSERT, UPDATE (status, confirmed_at, confirmed_by, confirmed_via, voided_at, void_reason)',
  evaluators: 'SELECT, INSERT',
  shipments: 'SELECT, INSERT, UPDATE (sent_at)',
  shipment_lines:
    'SELECT, INSERT, UPDATE (sent_seq, outcome, outcome_at, report_file_id, repairer, proof_load_kg, vertical_kg, rated_loads)',
  migrations: 'SELECT',
};

/** Gives the account on loopback these rights, and no others, on the connected database. */
export async function grantAppAccount(sequelize: Sequelize, account: string): Promise<void> {
  if (!/^\w{1,64}$/.test(account))
    throw new Error('The name of the database account has unusual characters.');
  const user = `'${account}'@'127.0.0.1'`;
  const [current] = await sequelize.query<{ db: string }>('SELECT DATABASE() AS db', {
    type: QueryTypes.SELECT,
  });
  const database = `\`${current?.db ?? ''}\``;
  for (const [table, rights] of Object.entries(GRANTS)) {
    await sequelize.query(`GRANT ${rights} ON ${database}.\`${table}\` TO ${user}`);
  }
}
