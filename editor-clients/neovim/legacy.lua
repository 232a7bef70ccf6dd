-- Irreproof for Neovim 0.7 to 0.10; newer ones: lsp/irreproof.lua.
-- Put this file into ~/.config/nvim/lua/ as irreproof.lua and call require('irreproof').setup() in init.lua.
-- Change settings with require('irreproof').setup({ init_options = { group = 'SU(5)' } }).
local M = {}

local defaults = {
  name = 'irreproof',
  cmd = { 'irreproof', 'serve' },
  init_options = {},
}

-- Neovim calls a chapter without \documentclass plaintex.
local filetypes = { 'tex', 'plaintex', 'markdown' }

local function root_of(buffer)
  local folder = vim.fn.fnamemodify(vim.api.nvim_buf_get_name(buffer), ':p:h')
  local above = vim.fn.escape(folder, ' ,;') .. ';'
  local config = vim.fn.findfile('irreproof.toml', above)
  if config ~= '' then
    return vim.fn.fnamemodify(config, ':p:h')
  end
  local git = vim.fn.finddir('.git', above)
  return git ~= '' and vim.fn.fnamemodify(git, ':p:h:h') or folder
end

-- Neovim 0.7 has no vim.lsp.start; one server for each root then is up to us.
local clients = {}

local function start(config, buffer)
  if vim.lsp.start then
    vim.lsp.start(config, { bufnr = buffer })
    return
  end
  local known = clients[config.root_dir] and vim.lsp.get_client_by_id(clients[config.root_dir])
  if not known or known.is_stopped() then
    clients[config.root_dir] = vim.lsp.start_client(config)
  end
  if clients[config.root_dir] then
    vim.lsp.buf_attach_client(buffer, clients[config.root_dir])
  end
end

function M.setup(options)
  local config = vim.tbl_deep_extend('force', defaults, options or {})
  vim.api.nvim_create_autocmd('FileType', {
    group = vim.api.nvim_create_augroup('irreproof', {}),
    pattern = filetypes,
    callback = function(args)
      if vim.bo[args.buf].buftype == '' then
        start(vim.tbl_extend('force', { root_dir = root_of(args.buf) }, config), args.buf)
      end
    end,
  })
end

return M
