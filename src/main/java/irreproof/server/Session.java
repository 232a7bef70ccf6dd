package irreproof.server;

/** What the initialize request settled for the rest of the conversation. */
record Session(ClientProfile client, Settings settings) {}
