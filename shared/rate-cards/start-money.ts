import type { MoneyCard } from '#shared/rate-cards/money-card';

const taxed = { percent: '0', exemptionReason: '' };

/** What the prices a workshop starts from are in (ISO 4217), those of leaf and materials as well. */
export const startCurrency = 'EUR';

/** The money part a workshop starts from: house values in EUR, every one to be changed. Rates of tax are placeholders for the workshop's own. */
export const startMoney: MoneyCard = {
  grades: [
    { id: 'master-carver', name: 'Master carver', costPerHour: '38.00' },
    { id: 'carver', name: 'Carver', costPerHour: '31.00' },
    { id: 'gilder', name: 'Gilder', costPerHour: '33.00' },
    { id: 'improver', name: 'Improver', costPerHour: '22.00' },
    { id: 'finisher', name: 'Finisher', costPerHour: '28.00' },
  ],
  overhead: { way: 'per-hour', perHour: '14.50' },
  contingency: { way: 'share', percent: '8', percentile: 80, distribution: 'pert', commonFactor: 0.5 },
  profit: { way: 'margin', percent: '18' },
  consumables_percent: '4',
  taxCategories: [
    { id: 'standard', name: 'Standard rate', code: 'S', percent: '20', exemptionReason: '' },
    { id: 'reduced', name: 'Reduced rate', code: 'S', percent: '10', exemptionReason: '' },
    { ...taxed, id: 'zero', name: 'Zero rate', code: 'Z' },
    { ...taxed, id: 'exempt', name: 'Exempt', code: 'E', exemptionReason: 'Exempt from VAT' },
    { ...taxed, id: 'reverse-charge', name: 'Reverse charge', code: 'AE', exemptionReason: 'Reverse charge' },
    {
      ...taxed,
      id: 'intra-community',
      name: 'Supply within the Union',
      code: 'K',
      exemptionReason: 'Intra-community supply',
    },
    { ...taxed, id: 'export', name: 'Export', code: 'G', exemptionReason: 'Export outside the European Union' },
    {
      ...taxed,
      id: 'outside-scope',
      name: 'Outside the scope of tax',
      code: 'O',
      exemptionReason: 'Not subject to tax',
    },
  ],
  defaultTaxCategoryId: 'standard',
  extras: {
    sampleBoard: { hours: 5, gradeId: 'gilder', booklets: 1, leafProductId: 'gold-23-5-loose' },
    packing: { hours: 6, gradeId: 'improver', crate: '180.00' },
    fitting: { people: 2, hours: 4, gradeId: 'gilder' },
    touchingIn: { hours: 2, gradeId: 'gilder' },
    insurance_percent: '0.4',
  },
  making: {
    timbers: [
      { id: 'lime', timberId: 'lime', name: 'Lime', pricePerDm3: '2.40' },
      { id: 'pine', timberId: 'pine', name: 'Pine', pricePerDm3: '1.10' },
      { id: 'poplar', timberId: 'poplar', name: 'Poplar', pricePerDm3: '1.50' },
      { id: 'mahogany', timberId: 'mahogany', name: 'Mahogany', pricePerDm3: '4.80' },
      { id: 'walnut', timberId: 'walnut', name: 'Walnut', pricePerDm3: '4.60' },
      { id: 'cherry', timberId: 'cherry', name: 'Cherry', pricePerDm3: '3.40' },
      { id: 'beech', timberId: 'beech', name: 'Beech', pricePerDm3: '1.40' },
      { id: 'maple', timberId: 'maple', name: 'Maple', pricePerDm3: '2.80' },
      { id: 'oak', timberId: 'oak', name: 'Oak', pricePerDm3: '2.90' },
    ],
    waste_percent: 40,
    joineryGradeId: 'carver',
    turningGradeId: 'carver',
  },
  terms: {
    deposit_percent: '30',
    retention_percent: '5',
    stages: [
      { id: 'carving', name: 'Carving approved', percent: '40' },
      { id: 'gilding', name: 'Gilding finished', percent: '40' },
      { id: 'fitted', name: 'Delivered and fitted', percent: '20' },
    ],
  },
  leafPricesHold_days: 30,
};
