/** What the tables have in common. Ids compare byte by byte, text as people compare it. */
export const tableSettings = 'ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci';
export const id = 'CHAR(36) CHARACTER SET ascii COLLATE ascii_bin';
export const hash = 'CHAR(64) CHARACTER SET ascii COLLATE ascii_bin';
export const instant = 'DATETIME(3)';
