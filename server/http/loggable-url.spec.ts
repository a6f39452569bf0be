import { loggableUrl } from './loggable-url';

describe('loggableUrl', () => {
  it.each([
    ['/api/invitations/abc_DEF-123', '/api/invitations/[secret]'],
    ['/api/password-resets/abc?x=1', '/api/password-resets/[secret]?x=1'],
    ['/api/digest/unsubscribe/abc', '/api/digest/unsubscribe/[secret]'],
  ])('keeps the secret of %s to itself', (url, logged) => {
    expect(loggableUrl(url)).toBe(logged);
  });

  it('leaves other addresses as they are', () => {
    for (const url of ['/api/password-resets', '/api/v1/sweeps/4/file', '/api/teams/a/invitations/7/resend']) {
      expect(loggableUrl(url)).toBe(url);
    }
  });
});
