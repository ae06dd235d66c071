import { spawn } from 'node:child_process'
import { createRequire } from 'node:module'

interface Message {
  readonly id?: number
  readonly method?: string
  readonly params?: unknown
  readonly result?: unknown
  readonly error?: { readonly message: string }
}

interface Place {
  readonly line: number
  readonly character: number
}

export interface StockDiagnostic {
  readonly message: string
  readonly range: { readonly start: Place; readonly end: Place }
}

/** A YAML language server that knows nothing of this language but its schema, as an editor starts it. */
export interface StockServer {
  /** Opens a text as a new document and waits for what is said of it. */
  open(text: string): Promise<{ readonly uri: string; readonly diagnostics: readonly StockDiagnostic[] }>
  /** Labels of what can be typed at a place. */
  complete(uri: string, at: Place): Promise<readonly string[]>
  hover(uri: string, at: Place): Promise<string>
  close(): Promise<void>
}

const record = (value: unknown): Record<string, unknown> =>
  typeof value === 'object' && value !== null ? (value as Record<string, unknown>) : {}

/** Starts the server over standard input and output and gives it the schema for every document. */
export const startStockServer = async (schema: object): Promise<StockServer> => {
  const program = createRequire(import.meta.url).resolve('yaml-language-server/bin/yaml-language-server')
  const child = spawn(process.execPath, [program, '--stdio'], { stdio: ['pipe', 'pipe', 'ignore'] })
  const waiting = new Map<number, (message: Message) => void>()
  const opened = new Map<string, (diagnostics: readonly StockDiagnostic[]) => void>()
  let ids = 0

  const send = (message: object): void => {
    const body = Buffer.from(JSON.stringify({ jsonrpc: '2.0', ...message }))
    child.stdin.write(`Content-Length: ${body.length}\r\n\r\n`)
    child.stdin.write(body)
  }

  const configuration = {
    yaml: { validate: true, hover: true, completion: true, format: { enable: false }, schemaStore: { enable: false } },
  }

  const answer = (message: Message): void => {
    const { id, method, params } = message
    if (method === undefined) {
      if (id !== undefined) waiting.get(id)?.(message)
      return
    }
    if (method === 'textDocument/publishDiagnostics') {
      const { uri, diagnostics } = record(params)
      opened.get(String(uri))?.(diagnostics as readonly StockDiagnostic[])
      return
    }
    if (id === undefined) return
    const items = record(params)['items']
    const result =
      method === 'workspace/configuration' && Array.isArray(items)
        ? items.map((item: unknown) => (record(item)['section'] === 'yaml' ? configuration.yaml : {}))
        : null
    send({ id, result })
  }

  let buffered = Buffer.alloc(0)
  child.stdout.on('data', (bytes: Buffer) => {
    buffered = Buffer.concat([buffered, bytes])
    for (;;) {
      const head = buffered.indexOf('\r\n\r\n')
      const length = /Content-Length: (\d+)/iu.exec(buffered.subarray(0, Math.max(head, 0)).toString('latin1'))?.[1]
      if (head < 0 || length === undefined || buffered.length < head + 4 + Number(length)) return
      const body = buffered.subarray(head + 4, head + 4 + Number(length)).toString('utf8')
      buffered = buffered.subarray(head + 4 + Number(length))
      answer(JSON.parse(body) as Message)
    }
  })

  const ask = (method: string, params: object): Promise<unknown> =>
    new Promise((done, fail) => {
      const id = ++ids
      waiting.set(id, ({ result, error }) => {
        waiting.delete(id)
        if (error) fail(new Error(`${method}: ${error.message}`))
        else done(result)
      })
      send({ id, method, params })
    })

  await ask('initialize', {
    processId: process.pid,
    rootUri: null,
    capabilities: {
      workspace: { configuration: true, didChangeConfiguration: { dynamicRegistration: false } },
      textDocument: {
        completion: { completionItem: { documentationFormat: ['plaintext'] } },
        hover: { contentFormat: ['plaintext'] },
      },
    },
  })
  send({ method: 'initialized', params: {} })
  send({ method: 'workspace/didChangeConfiguration', params: { settings: configuration } })
  send({
    method: 'json/schemaAssociations',
    params: [[{ fileMatch: ['*.yaml'], uri: 'file:///coldfill-1.json', schema }]],
  })
  await ask('yaml/get/all/jsonSchemas', {}).catch(() => null)

  let documents = 0
  return {
    open: (text) =>
      new Promise((done) => {
        const uri = `file:///work/spec-${++documents}.yaml`
        opened.set(uri, (diagnostics) => {
          opened.delete(uri)
          done({ uri, diagnostics })
        })
        send({
          method: 'textDocument/didOpen',
          params: { textDocument: { uri, languageId: 'yaml', version: 1, text } },
        })
      }),
    complete: async (uri, position) => {
      const found = await ask('textDocument/completion', { textDocument: { uri }, position })
      const items = Array.isArray(found) ? found : record(found)['items']
      return Array.isArray(items) ? items.map((item: unknown) => String(record(item)['label'])) : []
    },
    hover: async (uri, position) => {
      const { contents } = record(await ask('textDocument/hover', { textDocument: { uri }, position }))
      const value = typeof contents === 'string' ? contents : record(contents)['value']
      return typeof value === 'string' ? value : ''
    },
    close: async () => {
      const gone = new Promise((done) => child.on('close', done))
      await ask('shutdown', {})
      send({ method: 'exit' })
      await gone
    },
  }
}
