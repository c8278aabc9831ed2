import type { Knex } from 'knex';
import '../tables';

/** Somebody with an account, without the password hash. */
export interface Person {
  readonly id: string;
  readonly email: string;
  readonly name: string;
}

export interface PersonWithPassword extends Person {
  readonly passwordHash: string;
}

/** Accounts. E-mail addresses are compared without regard to case. */
export function peopleRepository(database: Knex) {
  return {
    /** The account under an e-mail address, with its password hash, or undefined. */
    async findByEmail(email: string): Promise<PersonWithPassword | undefined> {
      const row = await database('people').whereRaw('lower(email) = lower(?)', [email]).first();
      return row && { id: row.id, email: row.email, name: row.name, passwordHash: row.password_hash };
    },

    /** Adds an account and returns its id; the database refuses an address that is taken. */
    async insert(person: Omit<PersonWithPassword, 'id'>): Promise<string> {
      const [row] = await database('people')
        .insert({ email: person.email, name: person.name, password_hash: person.passwordHash })
        .returning('id');
      if (!row) throw new Error('the database returned no row for a new person');
      return row.id;
    },
  };
}
