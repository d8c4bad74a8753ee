using CsvHelper;
using FlowDuct.Devices;
using FlowDuct.Errors;

namespace FlowDuct.Sheets.Batch;

/// <summary>Answers a record of a sheet by the same solver as a single command.</summary>
/// <param name="plan">The heading, compiled.</param>
/// <param name="extent">How much of an answer the results need.</param>
internal sealed class RowSolver(SheetPlan plan, Extent extent)
{
    private readonly RowBinder _binder = new(plan);

    /// <summary>The case of the record answered last.</summary>
    internal CaseDraft Draft => _binder.Draft;

    /// <summary>The answer of a record; it speaks of the draft, which the next record overwrites.</summary>
    internal RowAnswer Solve(CsvReader record)
    {
        try
        {
            _binder.Read(record);
            return Solve(Draft, extent);
        }
        catch (FlowDuctException refused)
        {
            return RowAnswer.Of(refused.Refusal);
        }
#pragma warning disable CA1031 // A defect met in one row must not take the answers of a million others with it; it is told in its row and by the exit status.
        catch (Exception defect)
        {
            return RowAnswer.Of(defect);
        }
#pragma warning restore CA1031
    }

    /// <summary>The answer of a case.</summary>
    /// <exception cref="FlowDuctException">There is none.</exception>
    internal static RowAnswer Solve(CaseDraft draft, Extent extent) => draft.Device == SheetDevice.State
        ? RowAnswer.Of(StateAnswer.Solve(draft.Frame.Fluid!, draft.At))
        : RowAnswer.Of(DeviceSolver.Solve(draft.Case(), extent));
}
