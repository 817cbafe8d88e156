import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import { QueryTypes, UniqueConstraintError } from 'sequelize';
import { Sequelize } from 'sequelize-typescript';
import type { Person, Role, SignUpBody } from '@fairlead/shared';
import { newId } from '../common/new-id';
import type { Viewer } from '../common/viewer';
import { Transactions } from '../database/transactions';
import { Company } from './models/company.model';
import { Membership } from './models/membership.model';
import { User } from './models/user.model';

interface Account {
  userId: string;
  companyId: string;
  passwordHash: string;
}

interface NewPerson {
  name: string;
  email: string;
  passwordHash: string;
}

@Injectable()
export class PeopleService {
  constructor(
    private readonly sequelize: Sequelize,
    private readonly transactions: Transactions,
    @InjectModel(Company) private readonly companies: typeof Company,
    @InjectModel(User) private readonly users: typeof User,
    @InjectModel(Membership) private readonly memberships: typeof Membership,
  ) {}

  /** Null when somebody already has the e-mail; the caller's transaction must then end without a trace. */
  createCompanyWithOwner(
    body: Omit<SignUpBody, 'password'> & NewPerson,
  ): Promise<Membership | null> {
    return this.transactions.run(async () => {
      const company = await this.companies.create({
        id: newId(),
        name: body.companyName,
        timeZone: knownTimeZone(body.timeZone),
        createdAt: new Date(),
      });
      return this.addPerson(company.id, 'owner', body);
    });
  }

  /** Null when somebody already has the e-mail. */
  addPerson(companyId: string, role: Role, person: NewPerson): Promise<Membership | null> {
    return this.transactions.run(async () => {
      const createdAt = new Date();
      const { name, email, passwordHash } = person;
      try {
        const user = await this.users.create({ id: newId(), name, email, passwordHash, createdAt });
        return await this.memberships.create({ companyId, userId: user.id, role, createdAt });
      } catch (thrown) {
        if (thrown instanceof UniqueConstraintError) return null;
        throw thrown;
      }
    });
  }

  /** The account behind an e-mail, in the company its person joined first. */
  async findAccount(email: string): Promise<Account | undefined> {
    const [account] = await this.sequelize.query<Account>(
      `SELECT u.id AS userId, m.company_id AS companyId, u.password_hash AS passwordHash
       FROM users u JOIN memberships m ON m.user_id = u.id
       WHERE u.email = :email ORDER BY m.created_at LIMIT 1`,
      { replacements: { email }, type: QueryTypes.SELECT },
    );
    return account;
  }

  /** Who a token speaks for, as the database stands now: nobody once the session ended or the membership is gone. */
  async findViewer(ids: {
    userId: string;
    sessionId: string;
    companyId: string;
  }): Promise<Viewer | undefined> {
    const [viewer] = await this.sequelize.query<Viewer>(
      `SELECT u.id AS userId, u.name, u.email, m.role, c.id AS companyId, c.name AS companyName,
              c.time_zone AS timeZone, s.id AS sessionId
       FROM sessions s
       JOIN memberships m ON m.company_id = s.company_id AND m.user_id = s.user_id
       JOIN users u ON u.id = s.user_id
       JOIN companies c ON c.id = s.company_id
       WHERE s.id = :sessionId AND s.user_id = :userId AND s.company_id = :companyId
         AND s.revoked_at IS NULL`,
      { replacements: ids, type: QueryTypes.SELECT },
    );
    return viewer;
  }

  list(companyId: string): Promise<Person[]> {
    return this.sequelize.query<Person>(
      `SELECT u.id, u.name, m.role FROM memberships m JOIN users u ON u.id = m.user_id
       WHERE m.company_id = :companyId ORDER BY u.name, u.id`,
      { replacements: { companyId }, type: QueryTypes.SELECT },
    );
  }

  async nameOf(userId: string): Promise<string> {
    const user = await this.users.findByPk(userId, { attributes: ['name'] });
    return user?.name ?? '';
  }

  async isMember(companyId: string, userId: string): Promise<boolean> {
    return (await this.memberships.count({ where: { companyId, userId } })) > 0;
  }
}

/** A name this Node does not know would break every date of the company. */
function knownTimeZone(name: string | undefined): string {
  try {
    return new Intl.DateTimeFormat('en', { timeZone: name ?? 'UTC' }).resolvedOptions().timeZone;
  } catch {
    return 'UTC';
  }
}
