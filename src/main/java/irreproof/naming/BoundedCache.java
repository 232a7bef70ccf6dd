package irreproof.naming;

import java.util.LinkedHashMap;
import java.util.Map;

/** A map that forgets the least recently used entry beyond its capacity; safe for threads. */
final class BoundedCache<K, V> {
    private final Map<K, V> entries;

    BoundedCache(int capacity) {
        entries = new LinkedHashMap<>(16, 0.75f, true) {
            @Override
            protected boolean removeEldestEntry(Map.Entry<K, V> eldest) {
                return size() > capacity;
            }
        };
    }

    /** The value kept, or null. */
    synchronized V get(K key) {
        return entries.get(key);
    }

    synchronized void put(K key, V value) {
        entries.put(key, value);
    }
}
