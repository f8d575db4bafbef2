import type { APIRequestContext } from '@playwright/test';
import { ENDPOINTS } from '@/lib/contracts/endpoints';
import type { CreateProjectBody, Project } from '@/lib/contracts/project';
import { callEndpoint } from './api';

/** Makes a project for whoever is signed in on the request's cookies: empty, from an example or from a job document. */
export function createProject(request: APIRequestContext, body: CreateProjectBody): Promise<Project> {
  return callEndpoint(request, ENDPOINTS.createProject, { body });
}
