/** What a zone takes of its member: a share of the surface, or parts of the girth by their keys. */
export type ZoneTake =
  | { readonly way: 'share'; readonly share_percent: number }
  | { readonly way: 'parts'; readonly parts: readonly string[] };
