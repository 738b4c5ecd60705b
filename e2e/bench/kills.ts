import { openTestDatabase } from '#api/testing/fresh-database.ts';
import { killSenders } from '#api/testing/kill-senders.ts';
import { seededStudio } from '#api/testing/studio.ts';
import { smtpControl } from '#fakes/smtp/control.ts';
import { start as startSmtp } from '#fakes/smtp/start.ts';
import { never, type Part } from './report.ts';

const kills = 200;

export const killedWorkers: Part = {
  name: 'kills',
  about: `the worker is killed ${kills} times in the middle of sending`,
  async run(note) {
    const database = await openTestDatabase({ seeded: seededStudio });
    const fake = await startSmtp({ port: 0, smtpPort: 0 });
    try {
      const { total, done, copies } = await killSenders(database, {
        mailbox: smtpControl(fake.url),
        smtpUrl: fake.smtpUrl,
        kills,
      });
      const all = [...copies.values()];
      const doubled = all.filter(({ length }) => length > 1);
      note(`${total} mails, ${doubled.length} came twice with the same Message-ID and bytes`);
      return [
        never(`a mail is lost to ${kills} kills`, total - Math.min(done, all.length)),
        never(
          'a mail comes a third time, or differs',
          doubled.filter((same) => same.length > 2 || new Set(same).size > 1).length,
        ),
        never('more mails come twice than workers died', Math.max(0, doubled.length - kills)),
      ];
    } finally {
      await fake.stop();
      await database.close();
    }
  },
};
