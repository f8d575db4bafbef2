import { z } from 'zod';

export const SHOP_ROLES = ['steward', 'maker', 'reviewer'] as const;
export const shopRole = z.enum(SHOP_ROLES);
export type ShopRole = (typeof SHOP_ROLES)[number];

export const PROJECT_ROLES = ['owner', 'editor', 'reviewer'] as const;
export const projectRole = z.enum(PROJECT_ROLES);
export type ProjectRole = (typeof PROJECT_ROLES)[number];

/** What may be done with a project, and by whom. The one table that server and screens both ask. */
export const PROJECT_PERMISSIONS = {
  'project.read': ['owner', 'editor', 'reviewer'],
  'project.comment': ['owner', 'editor', 'reviewer'],
  'project.duplicate': ['owner', 'editor', 'reviewer'],
  'project.download': ['owner', 'editor', 'reviewer'],
  'project.edit': ['owner', 'editor'],
  'project.fix-revision': ['owner', 'editor'],
  'project.manage-members': ['owner'],
  'project.delete': ['owner'],
} as const satisfies Record<string, readonly ProjectRole[]>;
export type ProjectPermission = keyof typeof PROJECT_PERMISSIONS;

/** What may be done in a shop, and by whom. */
export const SHOP_PERMISSIONS = {
  'shop.read': ['steward', 'maker', 'reviewer'],
  'shop.manage-cutters': ['steward'],
} as const satisfies Record<string, readonly ShopRole[]>;
export type ShopPermission = keyof typeof SHOP_PERMISSIONS;

/** Whether `role` (null: not a member) may do `permission` with the project. */
export function mayInProject(role: ProjectRole | null, permission: ProjectPermission): boolean {
  return role !== null && (PROJECT_PERMISSIONS[permission] as readonly ProjectRole[]).includes(role);
}

/** Whether `role` (null: not a member) may do `permission` in the shop. */
export function mayInShop(role: ShopRole | null, permission: ShopPermission): boolean {
  return role !== null && (SHOP_PERMISSIONS[permission] as readonly ShopRole[]).includes(role);
}
