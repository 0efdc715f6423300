import { issueTicket, takeTicket } from '$lib/server/auth/tickets';
import { describe, expect, it } from 'vitest';

describe('a ticket', () => {
  it('is good once, for whom it was written', () => {
    const ticket = issueTicket('ada', 1000);
    expect(takeTicket(ticket, 1000)).toBe('ada');
    expect(takeTicket(ticket, 1000)).toBeNull();
    expect(takeTicket('made up', 1000)).toBeNull();
  });

  it('runs out after half a minute', () => {
    expect(takeTicket(issueTicket('ada', 0), 30_000)).toBe('ada');
    expect(takeTicket(issueTicket('ada', 0), 30_001)).toBeNull();
  });
});
