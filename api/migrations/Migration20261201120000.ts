import { Migration } from '@mikro-orm/migrations';

/**
 * Tells whoever listens that a club's feed has grown: only which club, and where its feed stands. PostgreSQL
 * sends it when the transaction commits, and never when it does not.
 */
export class Migration20261201120000 extends Migration {
  override up(): void {
    this.addSql(`create function tell_club_seq() returns trigger language plpgsql as $$
      begin
        perform pg_notify('club_seq', new.club_id || ' ' || new.seq);
        return null;
      end
    $$`);
    this.addSql(`create trigger club_seq after update of seq on club for each row
      when (new.seq is distinct from old.seq) execute function tell_club_seq()`);
  }

  override down(): void {
    this.addSql('drop trigger club_seq on club');
    this.addSql('drop function tell_club_seq()');
  }
}
