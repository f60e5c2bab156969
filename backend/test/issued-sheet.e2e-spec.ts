import { contract } from '@bellgap/common/api';
import { pagesOf, scanned } from '../src/sheets/document/fixtures';
import { makeLine } from './support/line-project';
import { TestApp } from './support/test-app';
import { QUIET, issue, issueNext, signersOf, type Signers } from './support/to-issue';

// Sheets are drawn, printed and read here, and other tests share the machine.
jest.setTimeout(120_000);

describe('the print of an issued sheet', () => {
  let test: TestApp;
  let signers: Signers;
  const place = { code: 'L1', number: 'S-1' };
  const joined = (text: string) => text.replace(/\s+/g, ' ');
  const fileOf = async (id: string): Promise<Buffer> =>
    (await signers.engineer.call(contract.issuedSheetFile, { params: { id } })).response.body as Buffer;

  beforeAll(async () => {
    test = await TestApp.start({ PUBLIC_URL: 'https://sheets.kigc.example' });
    signers = await signersOf(test);
    await makeLine(signers.engineer, 'L1');
  });
  afterAll(() => test.stop());

  it('says page by page what the register says, and its square leads to the same code', async () => {
    const high = { ...QUIET, site: { ...QUIET.site!, altitudeM: 3900 } };
    const sheet = await issue(signers, place, high);
    const bytes = await fileOf(sheet.id);
    const pages = pagesOf(bytes).map(joined);
    expect(pages).toHaveLength(sheet.pages);
    pages.forEach((page, i) => {
      expect(page).toContain(`S-1 revision 0 content code ${sheet.contentCode}`);
      expect(page).toContain(`verification code ${sheet.verificationCode}`);
      expect(page).toContain(`look up the verification code at ${sheet.verificationUrl}`);
      expect(page).toContain(`page ${i + 1} of ${sheet.pages}`);
      expect(scanned(bytes, i + 1, 'A4')).toBe(sheet.verificationUrl);
    });
    for (const page of pagesOf(bytes, 'raw')) expect(page).not.toMatch(/D\s*R\s*A\s*F\s*T\b|\bdraft\b/i);
    for (const { name, on } of [sheet.drafted, sheet.checked, sheet.approved]) {
      expect(pages[0]).toContain(name);
      expect(pages[0]).toContain(on);
    }
    const all = pages.join(' ');
    for (const words of ['Check record', 'Corin Ashby', 'By hand', 'line list', 'Seen and accepted', 'First issue'])
      expect(all).toContain(words);
    expect(sheet.acceptances).toBeGreaterThan(0);
    expect(pages[0]).toContain(`${sheet.acceptances} acceptance`);
  });

  it('names the sheet that it takes the place of', async () => {
    const other = { ...place, number: 'S-2' };
    const first = await issue(signers, other);
    expect(pagesOf(await fileOf(first.id))[0]).not.toContain('Supersedes');
    const second = await issueNext(signers, other);
    expect(joined(pagesOf(await fileOf(second.id))[0] ?? '')).toContain('Supersedes revision 0 of');
  });
});
