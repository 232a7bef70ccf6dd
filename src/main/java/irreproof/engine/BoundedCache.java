package irreproof.engine;

import irreproof.budget.Budget;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.function.Function;
import java.util.function.ToIntFunction;

/**
 * Remembers results of budgeted work, least recently used first out, bounded by the total size of the results; safe for
 * threads. A hit costs the budget what the work cost, and is not taken by a budget that could not have afforded the work:
 * whether work is refused thus never depends on what ran before.
 *
 * @param <K> what was asked, immutable
 * @param <V> the result, immutable
 */
public final class BoundedCache<K, V> {
    private record Entry<V>(V value, long steps) {}

    private final long capacity;
    private final ToIntFunction<V> sizeOf;
    private final Map<K, Entry<V>> entries = new LinkedHashMap<>(16, 0.75f, true);
    private long size;

    /**
     * @param capacity the total size that is kept
     * @param sizeOf the size of one result, in units of the caller's choice
     */
    public BoundedCache(long capacity, ToIntFunction<V> sizeOf) {
        this.capacity = capacity;
        this.sizeOf = sizeOf;
    }

    /** The remembered result, or that of the work, which runs outside of any lock. */
    public V get(K key, Budget budget, Function<Budget, V> work) {
        Entry<V> known;
        synchronized (entries) {
            known = entries.get(key);
        }
        if (known != null && known.steps <= budget.remaining()) {
            budget.spend(known.steps);
            return known.value;
        }
        long before = budget.remaining();
        V value = work.apply(budget);
        keep(key, new Entry<>(value, before - budget.remaining()));
        return value;
    }

    private void keep(K key, Entry<V> entry) {
        synchronized (entries) {
            Entry<V> replaced = entries.put(key, entry);
            size += sizeOf(entry) - (replaced == null ? 0 : sizeOf(replaced));
            var oldest = entries.entrySet().iterator();
            while (size > capacity && oldest.hasNext()) {
                size -= sizeOf(oldest.next().getValue());
                oldest.remove();
            }
        }
    }

    private long sizeOf(Entry<V> entry) {
        return 1L + sizeOf.applyAsInt(entry.value);
    }
}
