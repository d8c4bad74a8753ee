using System.Collections.Concurrent;
using System.Runtime.ExceptionServices;
using FlowDuct.Sheets.Csv;

namespace FlowDuct.Sheets.Batch;

/// <summary>
/// Takes blocks from the sheet through the workers and back into order. One thread reads and writes, so results are in the order of the
/// rows whatever the workers do, and a fixed set of blocks goes round, so memory does not grow with the sheet.
/// </summary>
internal sealed class BlockPipeline(int jobs, Func<BlockWorker> worker)
{
    private const int BlocksPerWorker = 3;

    /// <summary>Runs until the sheet ends or the consumer wants no more.</summary>
    /// <param name="fill">Fills a block; false where it is the last.</param>
    /// <param name="consume">Takes a block that was worked on; false to stop.</param>
    internal void Run(Func<RowBlock, bool> fill, Func<RowBlock, bool> consume)
    {
        if (jobs == 1) RunAlone(fill, consume);
        else RunTogether(fill, consume);
    }

    private void RunAlone(Func<RowBlock, bool> fill, Func<RowBlock, bool> consume)
    {
        BlockWorker alone = worker();
        var block = new RowBlock();
        bool more = true;
        while (more)
        {
            more = fill(block);
            alone.Process(block);
            if (!consume(block)) return;
        }
    }

    private void RunTogether(Func<RowBlock, bool> fill, Func<RowBlock, bool> consume)
    {
        using var queue = new BlockingCollection<Ticket>();
        Thread[] threads = [.. Enumerable.Range(0, jobs).Select(_ => Start(queue))];
        try
        {
            var free = new Stack<Ticket>(Enumerable.Range(0, jobs * BlocksPerWorker).Select(_ => new Ticket()));
            Circulate(queue, free, fill, consume);
        }
        finally
        {
            queue.CompleteAdding();
            foreach (Thread thread in threads) thread.Join();
        }
    }

    private static void Circulate(BlockingCollection<Ticket> queue, Stack<Ticket> free, Func<RowBlock, bool> fill, Func<RowBlock, bool> consume)
    {
        var underWay = new Queue<Ticket>();
        bool more = true;
        while (more || underWay.Count > 0)
        {
            if (more && free.TryPop(out Ticket? empty))
            {
                more = fill(empty.Block);
                underWay.Enqueue(empty);
                queue.Add(empty);
                continue;
            }

            Ticket done = underWay.Dequeue();
            done.Wait();
            if (!consume(done.Block)) return;
            free.Push(done);
        }
    }

    private Thread Start(BlockingCollection<Ticket> queue)
    {
        BlockWorker own = worker();
        var thread = new Thread(() =>
        {
            foreach (Ticket ticket in queue.GetConsumingEnumerable()) ticket.Work(own);
        })
        {
            IsBackground = true,
        };
        thread.Start();
        return thread;
    }

    /// <summary>A block with word of whether it was worked on.</summary>
    private sealed class Ticket
    {
        private readonly object _signal = new();
        private ExceptionDispatchInfo? _defect;
        private bool _isDone;

        internal RowBlock Block { get; } = new();

        internal void Work(BlockWorker worker)
        {
            try
            {
                worker.Process(Block);
            }
#pragma warning disable CA1031 // Thrown again by Wait, in the thread that can tell it.
            catch (Exception defect)
            {
                _defect = ExceptionDispatchInfo.Capture(defect);
            }
#pragma warning restore CA1031
            lock (_signal)
            {
                _isDone = true;
                Monitor.Pulse(_signal);
            }
        }

        internal void Wait()
        {
            lock (_signal)
            {
                while (!_isDone) Monitor.Wait(_signal);
                _isDone = false;
            }

            _defect?.Throw();
        }
    }
}
