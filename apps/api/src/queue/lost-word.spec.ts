import { isLostWord } from './lost-word';

const thrown = (message: string, code?: string, from = 'pg-boss/src/manager.js') =>
  Object.assign(new Error(message), {
    code,
    stack: `Error: ${message}\n    at async Manager.fail (${from}:493:20)`,
  });

describe('a rejection that nobody caught', () => {
  it.each([
    ['the database refuses', thrown('connect ECONNREFUSED 127.0.0.1:5432', 'ECONNREFUSED')],
    ['it was stopped', thrown('terminating connection due to administrator command', '57P01')],
    ['the line broke', thrown('Connection terminated unexpectedly')],
  ])('is a lost word of the queue where %s', (_, reason) => {
    expect(isLostWord(reason)).toBe(true);
  });

  it.each([
    ['it comes from elsewhere', thrown('connect ECONNREFUSED', 'ECONNREFUSED', 'our/own.js')],
    ['the statement is wrong', thrown('column "nme" does not exist', '42703')],
    ['it is no error', 'ECONNREFUSED'],
  ])('is a fault of ours where %s', (_, reason) => {
    expect(isLostWord(reason)).toBe(false);
  });
});
