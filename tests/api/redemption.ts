import { alderPeople } from '../cast';
import { askForLink, browser, type TestApp } from '../support/server';

/** Twenty redemptions of one link at the same moment from the browser that asked: one may win. */
export async function redemptionFindings(test: TestApp): Promise<string[]> {
  const agent = browser(test);
  const { token } = await askForLink(test, agent, alderPeople.manager.email);
  const answers = await Promise.all(Array.from({ length: 20 }, () => agent.post('/api/auth/session').send({ token })));
  const statuses = answers.map(({ status }) => status).sort();
  const wanted = [204, ...Array<number>(19).fill(410)];
  return JSON.stringify(statuses) === JSON.stringify(wanted) ? [] : [`answered ${statuses.join(' ')}`];
}
