import { Injectable, computed, inject } from '@angular/core';
import { cardTexts } from '#shared/estimates/card-texts';
import { textsOnPapers } from '#shared/estimates/texts-on-papers';
import { letterFindings, type TextOnPaper } from '#shared/words/letter-findings';
import { EstimateStore } from '../estimate-store';
import { Letterhead } from './letterhead';

/** Warnings of texts whose letters the fonts of the papers do not have: what was entered here, and what the papers take from elsewhere. */
@Injectable()
export class LettersNotPrinted {
  private readonly store = inject(EstimateStore);
  private readonly letterhead = inject(Letterhead);

  private readonly ofDraft = computed(() => {
    const draft = this.store.draft();
    return draft ? letterFindings(textsOnPapers(draft)) : [];
  });
  private readonly ofCard = computed(() => {
    const card = this.store.card();
    return card ? letterFindings(cardTexts(card)) : [];
  });
  private readonly ofPeople = computed(() => letterFindings(this.people()));

  readonly findings = computed(() => [...this.ofDraft(), ...this.ofPeople(), ...this.ofCard()]);

  private people(): TextOnPaper[] {
    const [workshop, client] = [this.letterhead.workshop(), this.letterhead.addressee()];
    const job = this.store.job();
    const texts = {
      workshop: workshop ? [workshop.name, ...workshop.addressLines, workshop.telephone, workshop.taxRegistration] : [],
      client: client ? [client.name, client.contact, client.address] : [],
      job: job ? [job.title, job.reference, job.site] : [],
    };
    return Object.entries(texts).map(([part, lines]) => ({ part, name: '', text: lines.join('\n') }));
  }
}
