import { TestBed } from '@angular/core/testing';
import { readFileSync } from 'node:fs';
import { clientIssue } from '../../test/client-issue';
import { ClientFrame } from './client-frame';
import { uncover, writeOpeningHead, writePapersHead } from './opening-head';

const [cover] = /<div class="opening">[\s\S]*<\/div>/.exec(readFileSync('frontend/src/client.html', 'utf8')) ?? [''];
const text = (part: string) => document.querySelector(`[data-part=${part}]`)?.textContent;
const shown = () => ['name', 'title', 'addressee', 'introduction'].map(text);
const list = () => document.querySelector<HTMLElement>('[data-part=papers]');

describe('The head over the page that is being opened', () => {
  beforeEach(() => {
    document.body.innerHTML = cover;
  });
  afterEach(() => uncover(document));

  it('says whose paper it is, what it is called, for whom, and its introduction, as plain text', () => {
    const issue = clientIssue({ introduction: 'Carved in <b>lime</b>.' });
    writeOpeningHead(document, issue);
    expect(shown()).toEqual(['Mill Yard Carvers', 'Pier table', 'Helena Marsh', 'Carved in <b>lime</b>.']);
  });

  it('says whose papers all of them are, and nothing of that over a single one', () => {
    const { letterhead } = clientIssue();
    writeOpeningHead(document, clientIssue());
    expect(list()?.hidden).toBe(true);
    writePapersHead(document, { letterhead, client: { name: 'Helena <i>Marsh</i>' }, jobs: [], invoices: [] });
    expect([list()?.hidden, list()?.textContent, text('name')]).toEqual([
      ...[false, 'Papers for Helena <i>Marsh</i>', 'Mill Yard Carvers'],
    ]);
  });

  it('leaves the introduction to the application where an answer stands before it', () => {
    const issue = clientIssue({ introduction: 'Carved in lime.' });
    writeOpeningHead(document, { ...issue, issue: { ...issue.issue, state: 'accepted' } });
    expect(shown().at(-1)).toBe('');
  });

  it('goes once the application has the paper, and not before', () => {
    const fixture = TestBed.createComponent(ClientFrame);
    TestBed.tick();
    expect(document.querySelector('.opening')).not.toBeNull();
    fixture.componentRef.setInput('letterhead', clientIssue().letterhead);
    TestBed.tick();
    expect(document.querySelector('.opening')).toBeNull();
    expect(() => writeOpeningHead(document, clientIssue())).not.toThrow();
  });
});
