@echo off
rem Starts the workbench of Modewright. Projects are kept in .modewright\workspace of the user's folder, or in the folder that MODEWRIGHT_WORKSPACE names.
setlocal
set "JAVA=javaw.exe"
if defined JAVA_HOME set "JAVA=%JAVA_HOME%\bin\javaw.exe"
where /q "%JAVA%" 2>nul || if not exist "%JAVA%" (
    echo Modewright needs Java 17 or newer: install it, or set JAVA_HOME. 1>&2
    pause
    exit /b 2
)
if not defined MODEWRIGHT_WORKSPACE set "MODEWRIGHT_WORKSPACE=%USERPROFILE%\.modewright\workspace"
for %%J in ("%~dp0plugins\org.eclipse.equinox.launcher_*.jar") do set "LAUNCHER=%%~fJ"
start "Modewright" "%JAVA%" "@%~dp0java.options" -jar "%LAUNCHER%" -data "%MODEWRIGHT_WORKSPACE%" %*
