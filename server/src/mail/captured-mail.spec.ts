import { createTransport } from 'nodemailer';
import { readCapturedMail } from './captured-mail.js';

/** A message as it goes over the wire, one character per byte. */
async function composed(subject: string, text: string): Promise<string> {
  const transport = createTransport({ streamTransport: true, buffer: true, newline: 'windows' });
  const { message } = (await transport.sendMail({
    from: 'Diffolio <diffolio@localhost.invalid>',
    to: 'editor@group.example',
    subject,
    text,
    html: '<p>not this part</p>',
    messageId: '<7@localhost.invalid>',
    date: new Date('2026-12-01T12:00:00Z'),
  })) as { message: Buffer };
  return message.toString('latin1');
}

describe('a captured message', () => {
  it.each([
    ['plain', 'Version 1.1 is released', 'Two lines,\nof text.'],
    [
      'with signs beyond ASCII',
      'Räthselhaft: D(λ) ≥ 0.25 cm²/s – n = 1.7',
      'D₀ = 0.2505(31) cm²/s, “so gut wie”\n\nÄther',
    ],
    [
      'with long lines',
      `A title ${'that goes on and on '.repeat(20)}until here`,
      `${'https://sheets.example/'.repeat(20)}=end`,
    ],
    [
      'that is mostly beyond ASCII',
      'Диффузия гелия в аргоне '.repeat(8).trim(),
      'Коэффициент диффузии\n'.repeat(30).trim(),
    ],
  ])('%s is read as it was written', async (_, subject, text) => {
    expect(readCapturedMail(await composed(subject, text))).toEqual({
      subject,
      to: 'editor@group.example',
      messageId: '<7@localhost.invalid>',
      sentAt: 'Tue, 01 Dec 2026 12:00:00 +0000',
      text,
    });
  });

  it('that is broken is shown as far as it goes', () => {
    expect(readCapturedMail('Subject: half a mess')).toEqual({
      subject: 'half a mess',
      to: '',
      messageId: '',
      sentAt: '',
      text: '',
    });
  });
});
