const { getDefaultConfig } = require('expo/metro-config')

/** Expo finds the workspace (watchFolders, nodeModulesPaths) by itself. */
const config = getDefaultConfig(__dirname)

/** zod re-exports all of its message languages; English alone ships (saves about 250 kB of JavaScript). */
config.resolver.resolveRequest = (context, moduleName, platform) => {
  if (moduleName.endsWith('/locales/index.js') && /[\\/]zod[\\/]/.test(context.originModulePath)) {
    return context.resolveRequest(context, moduleName.replace('locales/index.js', 'locales/en.js'), platform)
  }
  return context.resolveRequest(context, moduleName, platform)
}

module.exports = config
