import { z } from 'zod';
import type { Operation } from '../operation';
import { pageOf, pageQuery } from '../shapes/page';
import { newSiteMapQuery, sitesDocumentSchema, siteMapSchema } from '../shapes/site-map';

export const siteMapsQuery = z.strictObject({
  ...pageQuery,
  device: z.string().max(200).optional().describe('Of this device alone')
});
export const siteMapPageSchema = pageOf(siteMapSchema);

export const SITE_MAP_OPERATIONS: Operation[] = [
  {
    id: 'listSiteMaps',
    method: 'get',
    path: '/site-maps',
    part: 'Maps of sites',
    summary: 'List maps of sites',
    about: 'Newest first. What was put aside is not there.',
    scope: 'read',
    query: siteMapsQuery,
    answer: {
      status: 200,
      about: 'One page',
      content: { type: 'application/json', schema: siteMapPageSchema, about: 'A page of maps of sites' }
    }
  },
  {
    id: 'uploadSites',
    method: 'post',
    path: '/site-maps',
    part: 'Maps of sites',
    summary: 'Upload site-resolved shots',
    about:
      'Every pair of sites is tested at once. The counts of excited sites are saved as a dataset, those of kinks where asked.',
    scope: 'upload',
    once: true,
    query: newSiteMapQuery,
    bodies: [
      {
        type: 'text/csv',
        schema: null,
        about: 'One row a shot: a 0 or 1 for each site, or one string of bits. A header may name the sites.',
        example: 'left,middle,right\n0,1,1\n0,0,0\n1,0,0\n'
      }
    ],
    answer: {
      status: 201,
      about: 'Saved',
      content: { type: 'application/json', schema: siteMapSchema, about: 'The map' },
      location: true
    },
    refusals: {
      400: 'The body did not arrive whole.',
      409: 'The same map of the same bytes is saved already (“already” names it), or the first request with this key is still being answered.',
      413: 'More than 4 MB.',
      415: 'Not text/csv.',
      422: 'The shots do not fit: “errors” gives line, column and reason. Or the Idempotency-Key came with another request before.'
    }
  },
  {
    id: 'readSiteMap',
    method: 'get',
    path: '/site-maps/{id}',
    part: 'Maps of sites',
    summary: 'Read a map of sites',
    scope: 'read',
    idOf: 'siteMap',
    answer: {
      status: 200,
      about: 'The map',
      content: { type: 'application/json', schema: siteMapSchema, about: 'A map of sites' }
    }
  },
  {
    id: 'readSiteMapDocument',
    method: 'get',
    path: '/site-maps/{id}/document.json',
    part: 'Maps of sites',
    summary: 'Take every pair of a map',
    scope: 'read',
    idOf: 'siteMap',
    answer: {
      status: 200,
      about: 'The document, byte for byte as it was stored',
      content: { type: 'application/json', schema: sitesDocumentSchema, about: 'severalty.sites/1' }
    }
  }
];
