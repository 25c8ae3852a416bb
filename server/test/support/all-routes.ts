import { RequestMethod } from '@nestjs/common'
import { ModulesContainer } from '@nestjs/core'
import type { Express } from 'express'
import { publicKey } from '../../src/platform/auth/public.decorator'
import { requiresKey, type Requirement } from '../../src/platform/auth/requires.decorator'
import { uploadKey } from '../../src/platform/auth/upload.decorator'
import type { TestApp } from './test-app'

export interface Route {
  /** As in `GET /jobs/:id`. */
  name: string
  method: 'get' | 'post' | 'put' | 'delete'
  path: string
  /** Null when the handler says nothing of who may call it. */
  access: Requirement | 'public' | null
  /** Takes one file instead of JSON. */
  isUpload: boolean
}

type Handler = (...given: unknown[]) => unknown

/** Every handler of every controller, with what it says of its callers. */
export function declaredRoutes({ nest }: TestApp): Route[] {
  const modules = [...nest.get(ModulesContainer).values()]
  const controllers = modules.flatMap((module) => [...module.controllers.values()])
  return controllers
    .flatMap(({ metatype }) => (typeof metatype === 'function' ? routesOf(metatype) : []))
    .sort((one, other) => one.name.localeCompare(other.name))
}

function routesOf(controller: object & { prototype?: unknown }): Route[] {
  const prefix: string = Reflect.getMetadata('path', controller)
  const prototype = controller.prototype as Record<string, Handler>
  return Object.getOwnPropertyNames(prototype).flatMap((key) => {
    const handler = prototype[key]
    const method: RequestMethod | undefined = handler && Reflect.getMetadata('method', handler)
    if (handler === undefined || method === undefined) return []
    const path = `/${prefix}/${Reflect.getMetadata('path', handler)}`.replace(/\/+/g, '/').replace(/\/$/, '')
    const verb = RequestMethod[method] ?? ''
    const access = Reflect.getMetadata(publicKey, handler)
      ? 'public'
      : (Reflect.getMetadata(requiresKey, handler) ?? null)
    const isUpload = Reflect.getMetadata(uploadKey, handler) === true
    const name = `${verb} ${path}`
    return [{ name, method: verb.toLowerCase() as Route['method'], path, access, isUpload }]
  })
}

interface Layer {
  route?: { path: string; methods: Record<string, boolean> }
}

/** Every route that Express really answers, whoever registered it. */
export function servedRoutes({ nest }: TestApp): string[] {
  const express: Express = nest.getHttpAdapter().getInstance()
  const layers = express.router.stack as Layer[]
  return layers
    .flatMap(({ route }) =>
      route ? Object.keys(route.methods).map((verb) => ({ verb, path: route.path })) : [],
    )
    .map(({ verb, path }) => `${verb.toUpperCase()} ${path.replace(/^\/api/, '')}`)
    .sort((one, other) => one.localeCompare(other))
}
