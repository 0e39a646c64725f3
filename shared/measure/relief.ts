/** How far ornament stands from its ground; the geometric factor is true surface ÷ plan surface. */
export const reliefs = ['flat', 'low', 'middle', 'high', 'pierced', 'in-the-round'] as const;
export type Relief = (typeof reliefs)[number];

/** How worked a surface is, for hands-on work. */
export const finishes = ['plain', 'moulded', 'carved'] as const;
export type SurfaceFinish = (typeof finishes)[number];
