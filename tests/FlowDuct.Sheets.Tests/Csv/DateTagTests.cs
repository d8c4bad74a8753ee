using System.Text;
using FlowDuct.Sheets.Csv;
using Xunit;

namespace FlowDuct.Sheets.Tests.Csv;

public class DateTagTests
{
    [Theory]
    [InlineData("12-Mar", true)]
    [InlineData("Mar-12", true)]
    [InlineData("MAR-2012", true)]
    [InlineData("1-Sep-26", true)]
    [InlineData("2026-03-12", true)]
    [InlineData("12/03/2026", true)]
    [InlineData("3.12.2026", true)]
    [InlineData("N-12", false)]
    [InlineData("FV-2012", false)]
    [InlineData("12-345", false)]
    [InlineData("10.21.A", false)]
    [InlineData("2026-X-12", false)]
    [InlineData("1-2-3-4-5", false)]
    [InlineData("", false)]
    public void A_tag_that_a_spreadsheet_made_a_date_is_known(string tag, bool expected) => Assert.Equal(expected, DateTag.LooksLike(Encoding.UTF8.GetBytes(tag)));
}
