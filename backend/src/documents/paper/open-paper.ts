import PDFDocument from 'pdfkit';
import { printableText } from '#shared/words/printable-text';
import { paperFonts } from './paper-fonts';
import { pageMargins } from './paper-colours';

/** What a paper is, apart from what stands on it. */
export interface PaperFacts {
  readonly title: string;
  readonly author: string;
  readonly subject: string;
  /** BCP 47, of the words on the paper. */
  readonly language: string;
  readonly size: 'A4' | 'Letter';
  /** Instant in UTC (ISO 8601). Nothing else in the file knows a time, so equal content is equal bytes. */
  readonly madeAt: string;
  /** To be kept for years with what lies in it: marked as PDF/A-3b as well (ISO 19005-3), with the colours it means named. */
  readonly isArchival?: boolean;
}

export type Pdf = PDFKit.PDFDocument;

/** The description inside the file is XML, which the library fills in as it stands. */
function escapeDescription(pdf: Pdf): void {
  const inner = pdf as unknown as { info: Record<string, unknown>; endMetadata: () => void };
  const end = inner.endMetadata.bind(pdf);
  const escaped = (text: unknown) => String(text).replace(/&/g, '&amp;').replace(/</g, '&lt;').replace(/>/g, '&gt;');
  inner.endMetadata = () => {
    for (const key of ['Title', 'Author', 'Subject']) inner.info[key] = escaped(inner.info[key]);
    end();
  };
}

/** One mark of the library's at a time: beside that of ISO 19005-3 that of ISO 14289 is written here, and what it is is described, as the former asks. */
const accessibleMark = `
        <rdf:Description rdf:about="" xmlns:pdfaExtension="http://www.aiim.org/pdfa/ns/extension/" xmlns:pdfaSchema="http://www.aiim.org/pdfa/ns/schema#" xmlns:pdfaProperty="http://www.aiim.org/pdfa/ns/property#">
            <pdfaExtension:schemas><rdf:Bag><rdf:li rdf:parseType="Resource">
                <pdfaSchema:schema>PDF/UA identification</pdfaSchema:schema>
                <pdfaSchema:namespaceURI>http://www.aiim.org/pdfua/ns/id/</pdfaSchema:namespaceURI>
                <pdfaSchema:prefix>pdfuaid</pdfaSchema:prefix>
                <pdfaSchema:property><rdf:Seq><rdf:li rdf:parseType="Resource">
                    <pdfaProperty:name>part</pdfaProperty:name>
                    <pdfaProperty:valueType>Integer</pdfaProperty:valueType>
                    <pdfaProperty:category>internal</pdfaProperty:category>
                    <pdfaProperty:description>Part of ISO 14289</pdfaProperty:description>
                </rdf:li></rdf:Seq></pdfaSchema:property>
            </rdf:li></rdf:Bag></pdfaExtension:schemas>
        </rdf:Description>
        <rdf:Description rdf:about="" xmlns:pdfuaid="http://www.aiim.org/pdfua/ns/id/">
            <pdfuaid:part>1</pdfuaid:part>
        </rdf:Description>`;

/** A paper with no page yet: tagged, with its language and title, the fonts of the house embedded. */
export function openPaper(facts: PaperFacts): Pdf {
  const pdf = new PDFDocument({
    size: facts.size === 'A4' ? 'A4' : 'LETTER',
    margins: { ...pageMargins },
    autoFirstPage: false,
    bufferPages: true,
    pdfVersion: '1.7',
    // The library knows this part of ISO 14289, its types do not yet.
    subset: facts.isArchival ? 'PDF/A-3b' : ('PDF/UA' as 'PDF/A-2'),
    tagged: true,
    displayTitle: true,
    lang: facts.language,
    // None of the standard fonts, which are not embedded, is ever touched.
    font: '',
    info: {
      Title: printableText(facts.title),
      Author: printableText(facts.author),
      Subject: printableText(facts.subject),
      Creator: 'Bolewright',
      Producer: 'Bolewright',
      CreationDate: new Date(facts.madeAt),
    },
  });
  // The library takes an opened font as well, which its types do not know.
  for (const [name, font] of Object.entries(paperFonts())) pdf.registerFont(name, font as unknown as Buffer);
  escapeDescription(pdf);
  if (facts.isArchival) (pdf as unknown as { appendXML: (xml: string) => void }).appendXML(accessibleMark);
  return pdf;
}

/** Ends a paper and gives its bytes. */
export function closedPaper(pdf: Pdf): Promise<Buffer> {
  return new Promise((resolve, reject) => {
    const parts: Buffer[] = [];
    pdf.on('data', (part: Buffer) => parts.push(part));
    pdf.on('end', () => resolve(Buffer.concat(parts)));
    pdf.on('error', reject);
    pdf.end();
  });
}
