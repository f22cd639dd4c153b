import 'server-only';

/** A name that every file system and header takes: `Two-bed bay 3.14` → `two-bed-bay-3.14.csv`. */
export const fileName = (name: string, ending: string): string => {
  const plain = name
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .toLowerCase()
    .replace(/[^a-z0-9.]+/g, '-')
    .replace(/^[-.]+|[-.]+$/g, '');
  return `${plain || 'room'}.${ending}`;
};
