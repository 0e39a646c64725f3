/** How much of a member a zone takes: a share of its area, or parts of its girth by their keys. */
export type Extent =
  { readonly by: 'share'; readonly share_percent: number } | { readonly by: 'parts'; readonly keys: readonly string[] };
