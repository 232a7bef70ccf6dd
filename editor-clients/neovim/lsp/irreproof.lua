-- Irreproof for Neovim 0.11 and newer; older ones: ../legacy.lua.
-- Put this file into ~/.config/nvim/lsp/ and call vim.lsp.enable('irreproof') in init.lua.
-- Change settings with vim.lsp.config('irreproof', { init_options = { group = 'SU(5)' } }).
---@type vim.lsp.Config
return {
  cmd = { 'irreproof', 'serve' },
  -- Neovim calls a chapter without \documentclass plaintex.
  filetypes = { 'tex', 'plaintex', 'markdown' },
  root_markers = { 'irreproof.toml', '.git' },
  init_options = {},
}
