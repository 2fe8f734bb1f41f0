const { getDefaultConfig } = require('expo/metro-config')

/** Expo finds the workspace (watchFolders, nodeModulesPaths) by itself. */
const config = getDefaultConfig(__dirname)

/** Parts of zod that nothing of ours calls: JSON schema both ways and compiled parsers. About 16 kB compressed. */
const ZOD_UNUSED = /[\\/](json-schema-processors|json-schema-generator|from-json-schema|compile)\.js$/

/** zod re-exports all of its message languages; English alone ships (saves about 250 kB of JavaScript). */
config.resolver.resolveRequest = (context, moduleName, platform) => {
  if (/[\\/]zod[\\/]/.test(context.originModulePath)) {
    if (ZOD_UNUSED.test(moduleName)) return { type: 'empty' }
    if (moduleName.endsWith('/locales/index.js')) {
      return context.resolveRequest(context, moduleName.replace('locales/index.js', 'locales/en.js'), platform)
    }
  }
  return context.resolveRequest(context, moduleName, platform)
}

module.exports = config
