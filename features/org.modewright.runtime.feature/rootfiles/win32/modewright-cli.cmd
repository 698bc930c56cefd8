@echo off
rem The command line of Modewright: modewright-cli COMMAND ..., for example modewright-cli check MODEL; --help lists the commands.
setlocal
set "JAVA=java.exe"
if defined JAVA_HOME set "JAVA=%JAVA_HOME%\bin\java.exe"
where /q "%JAVA%" 2>nul || if not exist "%JAVA%" (
    echo Modewright needs Java 17 or newer: install it, or set JAVA_HOME. 1>&2
    exit /b 2
)
for %%J in ("%~dp0plugins\org.eclipse.equinox.launcher_*.jar") do set "LAUNCHER=%%~fJ"
"%JAVA%" "@%~dp0java.options" -Djava.awt.headless=true -jar "%LAUNCHER%" -nosplash -data @none -application org.modewright.cli.application %*
exit /b %ERRORLEVEL%
